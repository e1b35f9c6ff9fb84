/** How far a new shop is on its way to the first confirmed visit. */
export const startSteps = ['rules', 'crew', 'people', 'job', 'visit', 'yes'] as const;
export type StartStep = (typeof startSteps)[number];

export type StartView = {
  done: Record<StartStep, boolean>;
  isSample: boolean;
  /** A sample shop of this person, to switch to. */
  sampleShopId: string | null;
};

/** How far a new shop is on its way to the first confirmed visit. */
export const startSteps = ['hours', 'crew', 'job', 'visit', 'yes', 'people'] as const;
export type StartStep = (typeof startSteps)[number];

/** A shop of one person has nobody to invite. */
export const laterSteps: readonly StartStep[] = ['people'];

export type StartView = {
  done: Record<StartStep, boolean>;
  /** The page that the first customer has by their link, while they have not said yes. */
  customerPage: string | null;
  isSample: boolean;
  /** A sample shop of this person, to switch to. */
  sampleShopId: string | null;
};

/** The chain of a job. A stage moves because something happened, never because somebody dragged a card. */

export const stages = [
  'enquiry',
  'to-measure',
  'measured',
  'released',
  'in-build',
  'ready',
  'installing',
  'snags',
  'signed-off',
  'on-hold',
  'called-off',
] as const;
export type Stage = (typeof stages)[number];

export const stageWords: Record<Stage, string> = {
  enquiry: 'Enquiry',
  'to-measure': 'To measure',
  measured: 'Measured',
  released: 'Released',
  'in-build': 'In build',
  ready: 'Ready',
  installing: 'Installing',
  snags: 'Snags',
  'signed-off': 'Signed off',
  'on-hold': 'On hold',
  'called-off': 'Called off',
};

export type StageEvent =
  /** A site measure was booked, or the job was taken on. */
  | 'measure-booked'
  | 'readings-handed-in'
  | 'revision-released'
  /** The bench took the newest revision up. */
  | 'sheet-taken-up'
  | 'bench-says-ready'
  | 'arrived-for-install'
  /** Later snags, after the signature, stand apart and move nothing. */
  | 'snag-opened'
  /** The customer signed, and no snag is open. */
  | 'signed'
  | 'put-on-hold'
  | 'called-off';

/** Where each event leads, and the stages it moves from; from any other stage it moves nothing. */
const moves: Record<
  Exclude<StageEvent, 'put-on-hold' | 'called-off'>,
  { from: Stage[]; to: Stage }
> = {
  'measure-booked': { from: ['enquiry'], to: 'to-measure' },
  'readings-handed-in': { from: ['enquiry', 'to-measure'], to: 'measured' },
  /** A new revision while it is built, or when it stands ready, sends it back to the bench to take up. */
  'revision-released': {
    from: ['enquiry', 'to-measure', 'measured', 'in-build', 'ready'],
    to: 'released',
  },
  'sheet-taken-up': { from: ['released'], to: 'in-build' },
  'bench-says-ready': { from: ['released', 'in-build'], to: 'ready' },
  'arrived-for-install': { from: ['released', 'in-build', 'ready'], to: 'installing' },
  'snag-opened': { from: ['installing'], to: 'snags' },
  signed: { from: ['installing', 'snags'], to: 'signed-off' },
};

/**
 * The stage after something happened. An event that does not belong to a stage leaves it as it is, so
 * that the same event told twice, or late from a phone, does no harm. A job on hold or called off stays
 * so until it is taken up again (`stageByHistory`).
 * Example: 'bench-says-ready' moves 'in-build' to 'ready', and leaves 'installing' alone.
 */
export function stageAfter(stage: Stage, event: StageEvent): Stage {
  if (stage === 'called-off') return stage;
  if (event === 'called-off') return 'called-off';
  if (stage === 'on-hold' || event === 'put-on-hold') return 'on-hold';
  const move = moves[event];
  return move.from.includes(stage) ? move.to : stage;
}

/**
 * Where a job on hold or called off goes when it is taken up again: what has happened is told anew, oldest
 * first, and the holds are left out.
 * Example: ['measure-booked', 'readings-handed-in', 'put-on-hold', 'revision-released'] gives 'released'.
 */
export function stageByHistory(history: readonly StageEvent[]): Stage {
  return history
    .filter((event) => event !== 'put-on-hold' && event !== 'called-off')
    .reduce<Stage>(stageAfter, 'enquiry');
}

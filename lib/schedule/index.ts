/** Planning of visits: order of work, lengths, daily pieces, the chain of a job. */
export { type Estimate, estimateVisit, type VisitWork } from './duration';
export { type DurationKey, durationSources, durationTable } from './duration-table';
export {
  type GateInput,
  type GateKey,
  type GateState,
  gateKeys,
  type JobFacts,
} from './gate-input';
export { type Gate, gateProblems, gatesFor, type Readiness, readinessFor } from './gates';
export { type Piece, type PiecesInput, splitIntoPieces } from './pieces';
export {
  type Stage,
  type StageEvent,
  stageAfter,
  stageByHistory,
  stages,
  stageWords,
} from './stages';
export { type VisitKind, visitKind, visitKinds } from './visit-kind';

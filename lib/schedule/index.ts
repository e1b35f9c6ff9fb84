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
export { eachStartOnce, findOpenings, variedOpenings } from './openings/find-openings';
export type {
  BusyPiece,
  FoundOpening,
  OpeningCrew,
  OpeningsInput,
  PlaceIndex,
} from './openings/opening-input';
export { durationWords, missedWords, openingWhy } from './openings/opening-words';
export { type Piece, type PiecesInput, splitIntoPieces, splitOverCalendar } from './pieces';
export {
  driveWhenUnknownMinutes,
  type OpeningWeights,
  usualOpeningWeights,
} from './planning-rules';
export {
  type Stage,
  type StageEvent,
  stageAfter,
  stageByHistory,
  stages,
  stageWords,
} from './stages';
export { type VisitKind, visitKind, visitKinds } from './visit-kind';
export {
  type CrewMember,
  crewCalendar,
  type DaysAway,
  goesOn,
  shopCalendar,
  type WorkCalendar,
} from './work-calendar';
export {
  type CrewPattern,
  hoursOn,
  patternOfShop,
  patternProblems,
  type WorkedHours,
} from './working-pattern';

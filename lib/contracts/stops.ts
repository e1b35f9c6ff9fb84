/** What a crew's phone keeps of one stop, besides the visit itself: enough for a day without a signal. */
import { z } from 'zod';
import type { ChecklistItem } from './checklists';
import type { CheckAnswer, PauseReason } from './day-events';
import type { Reading } from './readings';
import type { SheetView } from './rooms';
import type { SignOffView } from './sign-offs';
import { plainWords, type SnagView } from './snags';

export type StopView = {
  visitId: string;
  jobId: string;
  /** The shop's local day for which this was told; an access code is shown on its visit's days only. */
  date: string;
  parking: string;
  hasAccessCode: boolean;
  /** It is the day, and the reader is of the crew: the phone may take the code. */
  mayTakeCode: boolean;
  /** "White oak, clear matt". */
  finish: string;
  /** The newest released sheet of each room; none where the kind of visit sets nothing. */
  sheets: SheetView[];
  checklist: ChecklistItem[];
  /** The newest answer of each item. */
  checks: StopCheck[];
  pauses: StopPause[];
  snags: SnagView[];
  asFound: StopAsFound[];
  signOff: SignOffView | null;
};

export type StopCheck = { item: string; answer: CheckAnswer; words: string; at: string };
export type StopPause = { what: 'pause' | 'go-on'; why: PauseReason | null; at: string };
export type StopAsFound = {
  id: string;
  roomId: string;
  /** What was read, and against which release: told anew in the reader's language. */
  releaseId: string;
  readings: Reading[];
  disagreements: string[];
  changes: string[];
  at: string;
};

export const stopInput = z.object({ visitId: z.uuid() });

/** The code as it goes on to a crew's phone: for the visit's days, and not after. */
export type AccessCodeView = { visitId: string; date: string; code: string };

/** What the office tells the crew of a site and job; only what is given is changed. */
export const forCrewInput = z.object({
  jobId: z.uuid(),
  parking: plainWords(200).optional(),
  finish: plainWords(120).optional(),
  /** Kept sealed, and never shown in the office again; empty takes it away. */
  accessCode: plainWords(60).optional(),
});
export type ForCrewInput = z.infer<typeof forCrewInput>;
/** What the office sees of it: that there is a code, and since when. */
export type ForCrewView = {
  parking: string;
  finish: string;
  codeSetWords: string | null;
};

/** Snags on the wire: what is not right yet, who mends it, by when, and how it was closed. */
import { z } from 'zod';
import { type SnagKind, type SnagMender, snagKinds, snagMenders } from './snag-kinds';

const id = z.uuid();
/** Text that the database can keep: no NUL and no half of a surrogate pair. */
export const plainWords = (most: number) =>
  z
    .string()
    .trim()
    .max(most)
    .refine((words) => !words.includes('\0') && words.isWellFormed(), 'Type it again, in letters.');

export { type SnagKind, type SnagMender, snagKinds, snagMenders };

export const MOST_SNAG_PHOTOS = 8;
const photoIds = z.array(id).max(MOST_SNAG_PHOTOS).default([]);

/** What a snag says of itself, from site and from the office alike. */
export const snagFields = {
  kind: z.enum(snagKinds).default('fault'),
  roomId: id.nullable().default(null),
  unitId: id.nullable().default(null),
  /** The unit or place in words, "Sink 36" or "Filler left": it outlives a new layout. */
  place: plainWords(80).default(''),
  words: plainWords(600).min(1, 'Say what is not right.'),
  mender: z.enum(snagMenders),
  dueOn: z.iso.date().nullable().default(null),
  /** Photos may reach the office after the snag. */
  photoIds,
};

export const closeFields = { words: plainWords(400).default(''), photoIds };

/** A closed snag shows how: a word, a photo, or both. */
export const isShownClosed = (closing: { words: string; photoIds: readonly string[] }): boolean =>
  closing.words !== '' || closing.photoIds.length > 0;
export const closeNeeds = 'Say how it was mended, or take a photo of it.';

export const openSnagInput = z.object({ id, jobId: id, ...snagFields });
export type OpenSnagInput = z.infer<typeof openSnagInput>;

/** Only what is given is changed. */
export const changeSnagInput = z.object({
  snagId: id,
  mender: z.enum(snagMenders).optional(),
  dueOn: z.iso.date().nullable().optional(),
});
export type ChangeSnagInput = z.infer<typeof changeSnagInput>;

export const closeSnagInput = z
  .object({ snagId: id, ...closeFields })
  .refine(isShownClosed, { path: ['words'], message: closeNeeds });
export type CloseSnagInput = z.infer<typeof closeSnagInput>;

/** The bench answers a note from site: what it does about it, and when the part stands ready. */
export const answerSnagInput = z.object({
  snagId: id,
  words: plainWords(400).min(1, 'Say what the bench does about it.'),
  readyOn: z.iso.date().nullable().default(null),
});
export type AnswerSnagInput = z.infer<typeof answerSnagInput>;

/** The snags of one job, or every open one of the shop. */
export const listSnagsInput = z.object({ jobId: id.optional() });
export type ListSnagsInput = z.infer<typeof listSnagsInput>;

export type SnagView = {
  id: string;
  jobId: string;
  jobNumber: number;
  customerName: string;
  kind: SnagKind;
  roomId: string | null;
  roomName: string | null;
  unitId: string | null;
  place: string;
  words: string;
  mender: SnagMender;
  dueOn: string | null;
  dueWords: string | null;
  isLate: boolean;
  photoIds: string[];
  foundBy: string;
  foundAt: string;
  foundWords: string;
  /** Opened after the customer signed: it stands apart from what was signed. */
  isAfterSignOff: boolean;
  benchSays: string;
  benchReadyOn: string | null;
  closedAt: string | null;
  closedWords: string;
  closedPhotoIds: string[];
  closedBy: string | null;
};

/** A snag that a crew has to mend, and the visit from which it can say that it is done. */
export type CrewSnag = SnagView & {
  visitId: string;
  street: string;
  town: string;
  /** The day on which the crew is there next; null where no visit is booked. */
  nextOn: string | null;
};

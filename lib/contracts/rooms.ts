/** Rooms, readings, runs, fits and releases on the wire. The shapes themselves are the wall book's. */
import { z } from 'zod';
import type { Fit } from '@/lib/measure/fit';
import type { MissingReading } from '@/lib/measure/missing-reading';
import type { Revised } from '@/lib/sheet/revision-marks';
import { reading } from './readings';
import type { Run } from './runs';
import { run } from './runs';
import type { FitRules } from './shop-rules';
import { room, type Tool, type WallBook } from './wall-book';

const id = z.uuid();

/** The phone or the office makes the ids, so that a room begun without signal keeps its name. */
export const saveRoomInput = z.object({ jobId: id, room });
export type SaveRoomInput = z.infer<typeof saveRoomInput>;

/** Sent in order, any number of times; the answer names what is now safe with the office. */
export const recordReadingsInput = z.object({
  roomId: id,
  readings: z.array(z.unknown()).min(1).max(500),
});
export type RecordReadingsInput = z.infer<typeof recordReadingsInput>;
export const recordReadingsAnswer = z.object({
  /** Safe: the phone may delete these from its queue. */
  accepted: z.array(id),
  /** Not understood: the phone keeps them and shows them. */
  parked: z.array(z.object({ id: z.string(), message: z.string() })),
});
export type RecordReadingsAnswer = z.infer<typeof recordReadingsAnswer>;
/** One reading is parsed alone, so that a bad one does not hold up the rest. */
export const parseReading = (value: unknown) => reading.safeParse(value);

export const submitRoomInput = z.object({ roomId: id });

export const saveRunsInput = z.object({
  roomId: id,
  runs: z.array(run).max(20),
  /** `FitView.runsMark` as it was shown; runs that somebody changed meanwhile are then not written over. */
  seenRunsMark: z.string().max(40).optional(),
});
export type SaveRunsInput = z.infer<typeof saveRunsInput>;

export const roomIdInput = z.object({ roomId: id });
/** With the job, a room that is not drawn yet is begun. */
export const openWallBookInput = z.object({ roomId: id, jobId: id.optional() });
export type OpenWallBookInput = z.infer<typeof openWallBookInput>;
/** A book with no walls yet, for a room of this job that a phone may begin later without a signal. */
export const blankBookInput = z.object({ jobId: id, roomId: id });
export const sheetInput = z.object({ roomId: id, revision: z.string().regex(/^[A-Z]{1,4}$/) });

/** Everything a phone needs to measure one room. */
export type WallBookView = {
  jobId: string;
  jobTitle: string;
  customerName: string;
  wallBook: WallBook;
  runs: Run[];
  rules: FitRules;
  missing: MissingReading[];
  tools: Tool[];
  submittedAt: string | null;
  readers: Reader[];
};

/** One person who took readings of a room, and which. */
export type Reader = { personId: string; name: string; readingIds: string[] };

export type FitView = {
  jobId: string;
  jobTitle: string;
  customerName: string;
  street: string;
  wallBook: WallBook;
  runs: Run[];
  /** Names these runs; sent back with a change of them and with a release. */
  runsMark: string;
  rules: FitRules;
  fit: Fit;
  missing: MissingReading[];
  /** Who took which reading when, for "how it came about". */
  takenBy: Record<string, string>;
  releases: ReleaseRow[];
  /** What would change against the newest revision, in words; null where there is none. */
  changesSinceRelease: string[] | null;
};

export type ReleaseRow = {
  id: string;
  revision: string;
  releasedAtWords: string;
  releasedBy: string;
  changes: string[];
  takenUpWords: string | null;
  isSuperseded: boolean;
};

export const releaseSheetInput = z.object({
  roomId: id,
  /** Why it is released though something is missing or over; required then. */
  overrideReason: z.string().trim().max(400).default(''),
  /** Readings and runs that the releaser saw; a change meanwhile is refused. */
  seenReadingIds: z.array(id).max(10_000),
  seenRunsMark: z.string().max(40),
});
export type ReleaseSheetInput = z.infer<typeof releaseSheetInput>;

/** A released sheet, as frozen. */
export type SheetView = {
  release: ReleaseRow;
  overrideReason: string;
  jobId: string;
  jobNumber: number;
  jobTitle: string;
  customerName: string;
  street: string;
  shopName: string;
  roomName: string;
  wallBook: WallBook;
  runs: Run[];
  rules: FitRules;
  fit: Fit;
  engineVersion: string;
  /** "Ines Brand, Tue, Dec 1; Tape, class II, Laser meter": who read what the sheet stands on, when, with what. */
  measuredWords: string;
  /** The house may hold lead paint or asbestos. */
  isOldHouse: boolean;
  /** What differs on the drawings and in the cut list from the revision before; null on the first. */
  revised: Revised | null;
  /** The newest revision, when it is not this one. */
  newerRevision: string | null;
  /** Readings that came after the release, or runs that changed. */
  supersededBy: string[];
};

export const takeUpSheetInput = z.object({ releaseId: id });

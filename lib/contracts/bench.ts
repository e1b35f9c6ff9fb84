/** What the bench has to build, as its screen shows it. */

/** The newest sheet of a room, with when it is needed and how it stands. */
export type BenchSheet = {
  releaseId: string;
  jobId: string;
  roomId: string;
  jobNumber: number;
  jobTitle: string;
  customerName: string;
  roomName: string;
  revision: string;
  releasedAtWords: string;
  takenUpWords: string | null;
  isSuperseded: boolean;
  /** The first install that stands in the diary. */
  needOn: string | null;
  needWords: string | null;
  /** The cabinets are to be ready so many days later than they are needed; 0 when they are not late. */
  lateDays: number;
  readyOn: string | null;
  readyWords: string | null;
  /** They stand ready now. */
  isReady: boolean;
  readyWhere: string;
  readyWhy: string;
  finish: string;
  /** The shop's day now. */
  today: string;
};

/** A day to be driven: stops with their windows, crews with their bases. Times are minutes of one clock. */

export type DayStop = {
  id: string;
  /** Row and column of the drive matrix. */
  place: number;
  workMinutes: number;
  /** The crew arrives within [earliest, latest], both promised: never broken. Waiting is allowed. */
  earliest: number;
  latest: number;
  /** What the customer would like beside it; missing it counts as so many minutes of driving. */
  wish?: { from: number; until: number; missedMinutes: number };
  /** Room that it takes in the van, where vans are small; 0 when left out. */
  load?: number;
  /** Crews that may do it, by number; left out: all. */
  crews?: readonly number[];
};

export type DayCrew = {
  id: string;
  startPlace: number;
  endPlace: number;
  /** Leaves the start no earlier, is at the end no later. */
  leavesAt: number;
  homeBy: number;
  /** Left out: no limit. */
  capacity?: number;
};

/** Minutes from row to column. Cost and time are the same: a minute driven is a minute gone. */
export type DriveMatrix = readonly (readonly number[])[];

export type PlannedStop = { id: string; arrivesAt: number };

export type CrewRoute = {
  crewId: string;
  stops: PlannedStop[];
  driveMinutes: number;
  /** Minutes by which missed wishes count. */
  missedMinutes: number;
};

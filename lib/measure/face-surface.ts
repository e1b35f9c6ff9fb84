/** The face of an end wall between its readings: passes through each one, and says where it is guessed. */

/** One face reading of an end wall, in the run's frame. */
export type EndFacePoint = {
  /** Out from the set line, square to it. */
  yMm: number;
  zMm: number;
  /** Square to the end wall, positive into the room, from the plumb plane through the corners at zRef. */
  proudMm: number;
  uMm: number;
  /**
   * ∂(proud)/∂(lean): 0 where the reading was taken from a plumb reference that also shows zRef; the
   * height over zRef where only a straightedge was laid.
   */
  leanShareMm: number;
  /** ∂(proud)/∂(bow): 0 where a row places it from corner to corner, f(y) where only plumb was read. */
  bowShare: number;
  readingId: string;
};

export type FaceValue = {
  /** Without what lean and bow add by their shares. */
  proudMm: number;
  uMm: number;
  leanShareMm: number;
  bowShare: number;
  /** The reading that lies exactly here; null between readings. */
  readingId: string | null;
  /** What it was made of: readings, or values that were; see `readingsBehind`. */
  madeOf: readonly (string | FaceValue)[];
  /** Outside the readings: carried on along the angle and the lean. */
  extrapolated: boolean;
};

export type FaceSurface = {
  /** Lines on which a greatest or least value can lie. */
  yMm: number[];
  zMm: number[];
  at: (yMm: number, zMm: number) => FaceValue;
};

/** What nobody read: the wall's shape at y for a bow of 1, and the height its lean is counted from. */
export type UnreadFace = { bowShape: (yMm: number) => number; zRefMm: number; usualBowMm: number };

const SAME_PLACE_MM = 1e-6;
/** This near to a reading a place counts as read, as `whatIsMissing` asks for no more. */
const NEAR_ALONG_MM = 250;
const NEAR_HEIGHT_MM = 150;
/** Height over which a wall's usual bow is spread where it must be carried on up or down; from memory. */
const WALL_HEIGHT_MM = 2_400;

/**
 * Surface through the face readings, bilinear between the lines of their places.
 * Edge rule: outside the readings the last value is carried on along lean and bow, and marked.
 * Units and frame: millimetres; y out of the set line, z up, proud square to the end wall into the room.
 * Example: readings 2 at y 0 and 4 at y 600 give 3 at y 300. Problems: none. Source: common practice.
 */
export function faceSurface(points: EndFacePoint[], unread: UnreadFace): FaceSurface {
  const yMm = distinct(points.map((point) => point.yMm));
  const zMm = distinct(points.map((point) => point.zMm));
  if (points.length === 0) return { yMm, zMm, at: (y, z) => nobodyRead(y, z, unread) };
  const read = atPlaces(points, yMm, zMm);
  const nodes = yMm.map((_, i) =>
    zMm.map((_z, j) => read[i]?.[j] ?? fillNode(read, yMm, zMm, i, j, unread)),
  );
  const at = (y: number, z: number): FaceValue => {
    const alongY = bracket(yMm, y);
    const alongZ = bracket(zMm, z);
    const column = (i: number) =>
      acrossZ(nodes[i]?.[alongZ.low], nodes[i]?.[alongZ.high], zMm, alongZ, z, unread);
    return acrossY(column(alongY.low), column(alongY.high), yMm, alongY, y, unread);
  };
  return { yMm, zMm, at };
}

/** Ids of the readings behind a value; sought only where it governs, for there are many values. */
export function readingsBehind(value: Pick<FaceValue, 'madeOf'>): string[] {
  const ids = value.madeOf.flatMap((part) =>
    typeof part === 'string' ? [part] : readingsBehind(part),
  );
  return [...new Set(ids)];
}

function nobodyRead(yMm: number, zMm: number, unread: UnreadFace): FaceValue {
  return {
    proudMm: 0,
    uMm: 0,
    leanShareMm: zMm - unread.zRefMm,
    bowShare: unread.bowShape(yMm),
    readingId: null,
    madeOf: [],
    extrapolated: true,
  };
}

function distinct(values: number[]): number[] {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted.filter((value, i) => i === 0 || value - (sorted[i - 1] ?? 0) > SAME_PLACE_MM);
}

/** The readings on their grid of places: the mean where there are several, null where there is none. */
function atPlaces(points: EndFacePoint[], yMm: number[], zMm: number[]): (FaceValue | null)[][] {
  const here: EndFacePoint[][][] = yMm.map(() => zMm.map(() => []));
  const placeOf = (places: number[], value: number) => {
    let i = 0;
    while (Math.abs((places[i] ?? value) - value) > SAME_PLACE_MM) i++;
    return i;
  };
  for (const point of points) {
    here[placeOf(yMm, point.yMm)]?.[placeOf(zMm, point.zMm)]?.push(point);
  }
  return here.map((column) => column.map(meanHere));
}

function meanHere(here: EndFacePoint[]): FaceValue | null {
  const [first] = here;
  if (!first) return null;
  if (here.length === 1) {
    const { proudMm, uMm, leanShareMm, bowShare, readingId } = first;
    const madeOf = [readingId];
    return { proudMm, uMm, leanShareMm, bowShare, readingId, madeOf, extrapolated: false };
  }
  const mean = (of: (point: EndFacePoint) => number) =>
    here.reduce((sum, point) => sum + of(point), 0) / here.length;
  return {
    proudMm: mean((point) => point.proudMm),
    uMm: Math.min(...here.map((point) => point.uMm)),
    leanShareMm: mean((point) => point.leanShareMm),
    bowShare: mean((point) => point.bowShare),
    readingId: first.readingId,
    madeOf: here.map((point) => point.readingId),
    extrapolated: false,
  };
}

type Bracket = { low: number; high: number; t: number; spanMm: number; beyondMm: number };

function bracket(places: number[], value: number): Bracket {
  const last = places.length - 1;
  const first = places[0] ?? 0;
  const end = places[last] ?? 0;
  if (value <= first) return { low: 0, high: 0, t: 0, spanMm: 0, beyondMm: first - value };
  if (value >= end) return { low: last, high: last, t: 0, spanMm: 0, beyondMm: value - end };
  let low = 0;
  while ((places[low + 1] ?? end) <= value) low++;
  const from = places[low] ?? 0;
  const spanMm = (places[low + 1] ?? end) - from;
  return { low, high: low + 1, t: (value - from) / spanMm, spanMm, beyondMm: 0 };
}

function mixed(a: FaceValue, b: FaceValue, t: number, uSag: number): FaceValue {
  if (t === 0) return a;
  const between = (one: number, other: number) => one + (other - one) * t;
  return {
    proudMm: between(a.proudMm, b.proudMm),
    uMm: Math.hypot(between(a.uMm, b.uMm), uSag),
    leanShareMm: between(a.leanShareMm, b.leanShareMm),
    bowShare: between(a.bowShare, b.bowShare),
    readingId: null,
    madeOf: [a, b],
    extrapolated: a.extrapolated || b.extrapolated,
  };
}

/** Up and down: between readings a bow of β over the height sags; beyond them the wall leans on. */
function acrossZ(
  low: FaceValue | undefined,
  high: FaceValue | undefined,
  places: number[],
  place: Bracket,
  zMm: number,
  unread: UnreadFace,
): FaceValue {
  const a = low ?? nobodyRead(0, zMm, unread);
  if (place.beyondMm > SAME_PLACE_MM) {
    const grown = Math.min(1, (4 * place.beyondMm) / WALL_HEIGHT_MM) * unread.usualBowMm;
    return {
      ...a,
      uMm: Math.hypot(a.uMm, grown / Math.sqrt(3)),
      leanShareMm: a.leanShareMm + zMm - (places[place.low] ?? zMm),
      readingId: null,
      extrapolated: a.extrapolated || place.beyondMm > NEAR_HEIGHT_MM,
    };
  }
  const part = Math.min(1, place.spanMm / WALL_HEIGHT_MM);
  const sag = 4 * unread.usualBowMm * part * part * place.t * (1 - place.t);
  return mixed(a, high ?? a, place.t, sag / Math.sqrt(3));
}

/** Along the wall the unread bow is a parameter of the run, shared with the corner's angle. */
function acrossY(
  low: FaceValue,
  high: FaceValue,
  places: number[],
  place: Bracket,
  yMm: number,
  { bowShape }: UnreadFace,
): FaceValue {
  const here = mixed(low, high, place.t, 0);
  const lowShape = bowShape(places[place.low] ?? 0);
  const highShape = bowShape(places[place.high] ?? 0);
  const atNodes = lowShape + (highShape - lowShape) * place.t;
  const bowShare = here.bowShare + bowShape(yMm) - atNodes;
  if (place.beyondMm <= SAME_PLACE_MM) return { ...here, bowShare };
  const extrapolated = here.extrapolated || place.beyondMm > NEAR_ALONG_MM;
  return { ...here, bowShare, readingId: null, extrapolated };
}

/** A place of the grid without a reading: between its neighbours in the row and in the column. */
function fillNode(
  read: (FaceValue | null)[][],
  yMm: number[],
  zMm: number[],
  i: number,
  j: number,
  unread: UnreadFace,
): FaceValue {
  const rowLine = read.map((column) => column[j] ?? null);
  const row = neighbours(rowLine, yMm, i);
  const column = neighbours(read[i] ?? [], zMm, j);
  const found: { node: FaceValue; weight: number }[] = [];
  if (row) {
    const node = acrossY(row.low, row.high, row.places, row.place, yMm[i] ?? 0, unread);
    found.push({ node, weight: 1 / row.distanceMm });
  }
  if (column) {
    const node = acrossZ(column.low, column.high, column.places, column.place, zMm[j] ?? 0, unread);
    found.push({ node, weight: 1 / column.distanceMm });
  }
  const inside = found.filter(({ node }) => !node.extrapolated);
  const used = inside.length > 0 ? inside : found;
  const total = used.reduce((sum, { weight }) => sum + weight, 0);
  const mean = (of: (node: FaceValue) => number) =>
    used.reduce((sum, { node, weight }) => sum + of(node) * weight, 0) / total;
  return {
    proudMm: mean((node) => node.proudMm),
    uMm: Math.max(...used.map(({ node }) => node.uMm)),
    leanShareMm: mean((node) => node.leanShareMm),
    bowShare: mean((node) => node.bowShare),
    readingId: null,
    madeOf: used.map(({ node }) => node),
    extrapolated: inside.length === 0,
  };
}

type Neighbours = {
  low: FaceValue;
  high: FaceValue;
  places: number[];
  place: Bracket;
  distanceMm: number;
};

function neighbours(
  line: (FaceValue | null)[],
  places: number[],
  index: number,
): Neighbours | null {
  const here = places[index] ?? 0;
  let before = index - 1;
  while (before >= 0 && !line[before]) before--;
  let after = index + 1;
  while (after < line.length && !line[after]) after++;
  const low = line[before] ?? null;
  const high = line[after] ?? null;
  const used = [low ? (places[before] ?? here) : null, high ? (places[after] ?? here) : null];
  const known = used.filter((place) => place !== null);
  const first = low ?? high;
  if (!first) return null;
  const place = bracket(known, here);
  return {
    low: first,
    high: high ?? first,
    places: known,
    place,
    distanceMm: place.beyondMm || place.spanMm,
  };
}

/** The face of an end wall between its readings: passes through each one, and says where it is guessed. */

/** One face reading of an end wall, in the run's frame. */
export type EndFacePoint = {
  /** Out from the set line, square to it. */
  yMm: number;
  zMm: number;
  /** Square to the end wall, positive into the room, less the lean; from the straight line corner to corner. */
  bMm: number;
  uMm: number;
  /**
   * How much of the wall's unread bow moves this reading: 0 where a row places it from the chord,
   * f(y) where only plumb was read (f: 1 at the middle of the wall, 0 at its ends).
   */
  bowShare: number;
  readingId: string;
};

export type FaceValue = {
  bMm: number;
  uMm: number;
  /** ∂(face)/∂(bow of the wall): what a bow nobody read would move here. */
  bowShare: number;
  /** The reading that lies exactly here; null between readings. */
  readingId: string | null;
  from: string[];
  /** Outside the readings: carried on along the angle and the lean. */
  extrapolated: boolean;
};

export type FaceSurface = {
  /** Lines on which a greatest or least value can lie. */
  yMm: number[];
  zMm: number[];
  at: (yMm: number, zMm: number) => FaceValue;
};

type Node = Omit<FaceValue, 'readingId'> & { readingId: string | null };

const SAME_PLACE_MM = 1e-6;
/** Height over which a wall's usual bow is spread where it must be carried on up or down; from memory. */
const WALL_HEIGHT_MM = 2_400;

/**
 * Surface through the face readings, bilinear between the lines of their places.
 * Edge rule: outside the readings the last value is carried on and marked; u grows upward and downward.
 * Units and frame: millimetres; y out of the set line, z up, b square to the end wall into the room.
 * Example: readings 2 at y 0 and 4 at y 600 give 3 at y 300. Problems: none. Source: common practice.
 */
export function faceSurface(
  points: EndFacePoint[],
  usualBowMm: number,
  bowShape: (yMm: number) => number,
): FaceSurface {
  const yMm = distinct(points.map((point) => point.yMm));
  const zMm = distinct(points.map((point) => point.zMm));
  if (points.length === 0) return { yMm, zMm, at: (y) => unread(bowShape(y)) };
  const read = yMm.map((y) => zMm.map((z) => exactly(points, y, z)));
  const nodes = yMm.map((_, i) =>
    zMm.map((_z, j) => read[i]?.[j] ?? fillNode(read, yMm, zMm, i, j, usualBowMm, bowShape)),
  );
  const at = (y: number, z: number): FaceValue => {
    const alongY = bracket(yMm, y);
    const alongZ = bracket(zMm, z);
    const column = (i: number) =>
      acrossZ(nodes[i]?.[alongZ.low], nodes[i]?.[alongZ.high], alongZ, usualBowMm);
    return acrossY(column(alongY.low), column(alongY.high), yMm, alongY, y, bowShape);
  };
  return { yMm, zMm, at };
}

function unread(bowShare: number): FaceValue {
  return { bMm: 0, uMm: 0, bowShare, readingId: null, from: [], extrapolated: true };
}

function distinct(values: number[]): number[] {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted.filter((value, i) => i === 0 || value - (sorted[i - 1] ?? 0) > SAME_PLACE_MM);
}

/** Mean of the readings at exactly one place; null where there is none. */
function exactly(points: EndFacePoint[], yMm: number, zMm: number): Node | null {
  const here = points.filter(
    (point) =>
      Math.abs(point.yMm - yMm) <= SAME_PLACE_MM && Math.abs(point.zMm - zMm) <= SAME_PLACE_MM,
  );
  const first = here[0];
  if (!first) return null;
  const mean = (of: (point: EndFacePoint) => number) =>
    here.reduce((sum, point) => sum + of(point), 0) / here.length;
  return {
    bMm: mean((point) => point.bMm),
    uMm: Math.min(...here.map((point) => point.uMm)),
    bowShare: mean((point) => point.bowShare),
    readingId: first.readingId,
    from: here.map((point) => point.readingId),
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

function mixed(a: Node, b: Node, t: number, uSag: number): Node {
  if (t === 0) return a;
  return {
    bMm: a.bMm + (b.bMm - a.bMm) * t,
    uMm: Math.hypot(a.uMm + (b.uMm - a.uMm) * t, uSag),
    bowShare: a.bowShare + (b.bowShare - a.bowShare) * t,
    readingId: null,
    from: a === b ? a.from : [...new Set([...a.from, ...b.from])],
    extrapolated: a.extrapolated || b.extrapolated,
  };
}

/** Up and down: a bow of β over the wall's height sags β(d/H)² over a part d nobody read. */
function acrossZ(
  low: Node | undefined,
  high: Node | undefined,
  place: Bracket,
  usualBowMm: number,
): Node {
  const a = low ?? unread(0);
  if (place.beyondMm > SAME_PLACE_MM) {
    const grown = Math.min(1, (4 * place.beyondMm) / WALL_HEIGHT_MM) * usualBowMm;
    return {
      ...a,
      uMm: Math.hypot(a.uMm, grown / Math.sqrt(3)),
      readingId: null,
      extrapolated: true,
    };
  }
  const part = Math.min(1, place.spanMm / WALL_HEIGHT_MM);
  const sag = 4 * usualBowMm * part * part * place.t * (1 - place.t);
  return mixed(a, high ?? a, place.t, sag / Math.sqrt(3));
}

/** Along the wall the unread bow is a parameter of the run, shared with the corner's angle. */
function acrossY(
  low: Node,
  high: Node,
  places: number[],
  place: Bracket,
  yMm: number,
  bowShape: (yMm: number) => number,
): Node {
  const here = mixed(low, high, place.t, 0);
  const lowShape = bowShape(places[place.low] ?? 0);
  const highShape = bowShape(places[place.high] ?? 0);
  const atNodes = lowShape + (highShape - lowShape) * place.t;
  const bowShare = here.bowShare + bowShape(yMm) - atNodes;
  if (place.beyondMm <= SAME_PLACE_MM) return { ...here, bowShare };
  return { ...here, bowShare, readingId: null, extrapolated: true };
}

/** A place of the grid without a reading: between its neighbours in the row and in the column. */
function fillNode(
  read: (Node | null)[][],
  yMm: number[],
  zMm: number[],
  i: number,
  j: number,
  usualBowMm: number,
  bowShape: (yMm: number) => number,
): Node {
  const rowLine = read.map((column) => column[j] ?? null);
  const row = neighbours(rowLine, yMm, i);
  const column = neighbours(read[i] ?? [], zMm, j);
  const found: { node: Node; weight: number }[] = [];
  if (row) {
    const node = acrossY(row.low, row.high, row.places, row.place, yMm[i] ?? 0, bowShape);
    found.push({ node, weight: 1 / row.distanceMm });
  }
  if (column) {
    const node = acrossZ(column.low, column.high, column.place, usualBowMm);
    found.push({ node, weight: 1 / column.distanceMm });
  }
  const inside = found.filter(({ node }) => !node.extrapolated);
  const used = inside.length > 0 ? inside : found;
  const total = used.reduce((sum, { weight }) => sum + weight, 0);
  const mean = (of: (node: Node) => number) =>
    used.reduce((sum, { node, weight }) => sum + of(node) * weight, 0) / total;
  return {
    bMm: mean((node) => node.bMm),
    uMm: Math.max(...used.map(({ node }) => node.uMm)),
    bowShare: mean((node) => node.bowShare),
    readingId: null,
    from: [...new Set(used.flatMap(({ node }) => node.from))],
    extrapolated: inside.length === 0,
  };
}

type Neighbours = { low: Node; high: Node; places: number[]; place: Bracket; distanceMm: number };

function neighbours(line: (Node | null)[], places: number[], index: number): Neighbours | null {
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

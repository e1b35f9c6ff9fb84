/** Faces still to come: board over bare studs pushes each wall into the room after the room is adjusted. */
import type { AdjustedFrame } from '@/lib/measure/adjusted-frame';
import { figure } from '@/lib/measure/figure';
import type { RoomBook } from '@/lib/measure/room-book';
import { PARAMETER } from '@/lib/measure/run-frame';
import { type Problem, warning } from '@/lib/problem';

/** Board, skim and adhesive come out this much thicker or thinner than stated, ±mm; from memory. */
const THICKNESS_LIMIT_MM = 1;

export type FaceToCome = { thicknessMm: number; uMm: number };
export type FacesToCome = ReadonlyMap<string, FaceToCome>;

/**
 * The thickness to come on each wall that was read to bare studs.
 * Edge rule: a wall counts as bare when any of its lengths, corners or gaps was read to a bare stud.
 * Problems: warning `face-to-come`, about the walls.
 */
export function facesToCome(book: RoomBook): { faces: FacesToCome; problems: Problem[] } {
  const thicknessMm = book.room.wallThicknessToComeMm;
  const bare = new Set<string>();
  if (thicknessMm > 0) {
    for (const reading of book.readings) {
      if (reading.touches !== 'bare-stud') continue;
      const { kind } = reading;
      if (kind === 'length' || kind === 'pieces' || kind === 'face') bare.add(reading.wallId);
      if (kind === 'corner') bare.add(reading.cornerWallId);
    }
  }
  const uMm = THICKNESS_LIMIT_MM / Math.sqrt(3);
  const faces = new Map([...bare].map((wallId) => [wallId, { thicknessMm, uMm }]));
  if (bare.size === 0) return { faces, problems: [] };
  const names = book.walk.walls
    .filter(({ wall }) => bare.has(wall.id))
    .map(({ wall }) => wall.name)
    .join(', ');
  const words = `Read to bare studs: the face still to come on wall ${names} is taken off every size.`;
  return { faces, problems: [warning('face-to-come', words, [...bare])] };
}

/**
 * A wall's frame once the faces are on: each end loses t_end/sin θ + t_back/tan θ.
 * Edge rule: angles and leans stay. Units: mm, deg. Example: 2400 between 90° corners, 12.5 mm on the
 * wall and both ends: 2375. Source: common practice (ref M22), geometry of two pushed lines.
 */
export function pushedFrame(
  frame: AdjustedFrame,
  wallId: string,
  faces: FacesToCome,
): AdjustedFrame {
  const back = faces.get(wallId);
  let lossMm = 0;
  let variance = 0;
  let backSlope = 0;
  for (const end of [frame.left, frame.right]) {
    const face = end ? faces.get(end.wallId) : undefined;
    if (!end || (!face && !back)) continue;
    const theta = (end.angle.value * Math.PI) / 180;
    const sine = Math.sin(theta);
    if (end.angle.value >= 180 || sine < 0.17) continue;
    lossMm += (face?.thicknessMm ?? 0) / sine + (back?.thicknessMm ?? 0) / Math.tan(theta);
    variance += ((face?.uMm ?? 0) / sine) ** 2;
    backSlope += 1 / Math.tan(theta);
  }
  if (lossMm === 0 && variance === 0) return frame;
  variance += (backSlope * (back?.uMm ?? 0)) ** 2;
  const covariance = frame.covariance.map((row, i) =>
    row.map((value, j) => (i === PARAMETER.length && j === i ? value + variance : value)),
  );
  const length = figure(
    frame.length.value - lossMm,
    Math.hypot(frame.length.u, Math.sqrt(variance)),
    frame.length.from,
  );
  return { ...frame, length, covariance };
}

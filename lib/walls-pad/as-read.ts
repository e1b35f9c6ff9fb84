import type { Reading, ReadingOf } from '@/lib/contracts/readings';
import type { Tool, WallBook } from '@/lib/contracts/wall-book';
import { type Figure, figure } from '@/lib/measure/figure';
import { standingReadings } from '@/lib/measure/standing-readings';
import { lengthUncertainty } from '@/lib/measure/uncertainty';
import { piecesUncertainty, wholeOfPieces } from '@/lib/measure/wall-in-pieces';
import { angleOfReading } from './angle-of-reading';

/** What has been read of walls and corners, one figure each; not adjusted, for the pad's plan and checks. */
export type AsRead = { lengthMm: Map<string, Figure>; cornerDeg: Map<string, Figure> };

/**
 * Mean of the standing readings of every wall's length at the wall, and of every corner.
 *
 * Edge: what was not read is not there; lengths at the front depth and those in pieces count only where none was
 * read whole at the wall.
 */
export function asRead({ readings, tools }: WallBook): AsRead {
  const standing = standingReadings(readings);
  const toolOf = (reading: Reading) => tools.find(({ id }) => id === reading.toolId);
  const lengths = new Map<string, Figure[]>();
  const corners = new Map<string, Figure[]>();
  const atWall = new Set(
    standing
      .filter(isLength)
      .filter(isAtWall)
      .map(({ wallId }) => wallId),
  );
  for (const reading of standing) {
    const tool = toolOf(reading);
    if (!tool) continue;
    if (reading.kind === 'pieces' && !atWall.has(reading.wallId)) {
      add(lengths, reading.wallId, piecesFigure(reading, tool));
      continue;
    }
    if (isLength(reading) && (isAtWall(reading) || !atWall.has(reading.wallId))) {
      add(lengths, reading.wallId, lengthFigure(reading, tool));
    } else if (reading.kind === 'corner') {
      const { value } = angleOfReading(reading, tool);
      if (value) add(corners, reading.cornerWallId, value);
    }
  }
  return { lengthMm: means(lengths), cornerDeg: means(corners) };
}

function isLength(reading: Reading): reading is ReadingOf<'length'> {
  return reading.kind === 'length';
}

function isAtWall({ yMm }: ReadingOf<'length'>): boolean {
  return Math.abs(yMm) < 1;
}

function lengthFigure({ id, valueMm }: ReadingOf<'length'>, tool: Tool): Figure {
  return figure(valueMm, lengthUncertainty(tool, valueMm, 2), [id]);
}

function piecesFigure(reading: ReadingOf<'pieces'>, tool: Tool): Figure {
  const { uOwn, uCommon } = piecesUncertainty(tool, reading.piecesMm);
  return figure(wholeOfPieces(reading), Math.hypot(uOwn, uCommon), [reading.id]);
}

function add(groups: Map<string, Figure[]>, key: string, value: Figure): void {
  groups.set(key, [...(groups.get(key) ?? []), value]);
}

/** The greatest u of the group: readings by one tool share its error. */
function means(groups: Map<string, Figure[]>): Map<string, Figure> {
  return new Map(
    [...groups].map(([key, values]) => {
      const value = values.reduce((sum, each) => sum + each.value, 0) / values.length;
      const u = Math.max(...values.map((each) => each.u));
      return [
        key,
        figure(
          value,
          u,
          values.flatMap((each) => each.from),
        ),
      ];
    }),
  );
}

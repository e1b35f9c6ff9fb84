import type { SheetView } from '@/lib/contracts/rooms';
import type { Fit } from '@/lib/measure/fit';
import type { FitFigure } from '@/lib/measure/fit-figure';
import { figureText } from '@/lib/sheet/figure-text';
import { formatLength } from '@/lib/units/format-length';
import type { CrewWords } from '@/lib/words/crew';

export type SettingLine = {
  section: 'levels' | 'fillers' | 'kicks' | 'mitres' | 'long' | 'studs';
  /** The run; empty for the room. */
  name: string;
  said: string;
  isWrong: boolean;
};
type Sheet = Pick<SheetView, 'wallBook' | 'runs' | 'fit' | 'rules'>;

/**
 * What a crew sets by, from the released fit, in the crew's words: levels, fillers with their tapers, kicks,
 * mitres as they are, what the bench left long, studs.
 *
 * Edge: what the fit does not know has no line. Units: the shop's, on its step; ± is left to the sheet.
 * Example: a filler of 46 at the top and 54 at the foot: "left: 46 mm at the top, 54 mm at the foot; blank 64 mm".
 */
export function settingLines(
  { wallBook, runs, fit, rules }: Sheet,
  words: CrewWords,
): SettingLine[] {
  const length = (mm: number) => formatLength(mm, rules);
  const text = (figure: FitFigure) => figureText(figure, rules).value;
  const wallName = (wallId: string) =>
    wallBook.room.chains.flatMap(({ walls }) => walls).find(({ id }) => id === wallId)?.name ?? '';
  const line = (
    section: SettingLine['section'],
    name: string,
    said: string,
    isWrong = false,
  ): SettingLine => ({ section, name, said, isWrong });
  const { floor } = fit;
  const meet = new Set(runs.map(({ wallId }) => wallId));
  return [
    ...(floor
      ? [
          line(
            'levels',
            '',
            words.highPoint(wallName(floor.highPoint.wallId), length(floor.highPoint.xMm)),
          ),
        ]
      : []),
    ...fit.runs.flatMap(({ kicks, name }) =>
      kicks ? [line('levels', '', words.datum(name, length(kicks.datumMm + kicks.nominalMm)))] : [],
    ),
    ...fit.runs.flatMap((run) =>
      (['left', 'right'] as const).flatMap((side) => {
        const { filler } = run[side];
        if (!filler) return [];
        const top = filler.widths[0]?.width ?? filler.greatest;
        const foot = filler.widths.at(-1)?.width ?? filler.least;
        const said = `${words.filler(words.sides[side], text(top), text(foot))}; ${words.blank(text(filler.blank))}`;
        const isWrong = filler.verdict === 'short' || filler.verdict === 'loose';
        return [line('fillers', run.name, said, isWrong)];
      }),
    ),
    ...fit.runs.flatMap(({ name, kicks }) =>
      kicks
        ? [
            line(
              'kicks',
              name,
              words.kickRange(text(kicks.least), text(kicks.greatest)),
              kicks.corners.some(({ legs }) => legs !== 'within'),
            ),
          ]
        : [],
    ),
    ...fit.corners.flatMap(({ name, angle, saw, cornerWallId, leftWallId }) =>
      angle && saw && (meet.has(cornerWallId) || meet.has(leftWallId))
        ? [line('mitres', '', words.mitre(name, text(angle), text(saw)))]
        : [],
    ),
    ...fit.runs.flatMap(({ name, scribes }) =>
      scribes.map((scribe) =>
        line('long', name, `${words.edge(scribe)} ${text(scribe.allowance)}`),
      ),
    ),
    ...studLines(fit, wallName, length, words).map((said) => line('studs', '', said)),
  ];
}

/** Each wall's studs behind hung boxes, once, left to right. */
function studLines(
  fit: Fit,
  wallName: (wallId: string) => string,
  length: (mm: number) => string,
  words: CrewWords,
): string[] {
  const byWall = new Map<string, Map<number, boolean>>();
  for (const { wallId, units } of fit.runs) {
    const ofWall = byWall.get(wallId) ?? new Map<number, boolean>();
    for (const { studs } of units) {
      for (const { xMm, predicted } of studs?.studs ?? []) ofWall.set(Math.round(xMm), predicted);
    }
    byWall.set(wallId, ofWall);
  }
  return [...byWall].flatMap(([wallId, studs]) => {
    if (studs.size === 0) return [];
    const list = [...studs].sort(([one], [other]) => one - other);
    const said = list.map(([xMm, predicted]) => length(xMm) + (predicted ? '*' : '')).join(', ');
    const note = list.some(([, predicted]) => predicted) ? ` (* ${words.predicted})` : '';
    return [words.studsAt(wallName(wallId), said) + note];
  });
}

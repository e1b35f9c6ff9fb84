import type { StopView } from '@/lib/contracts/stops';
import { unitIn } from '@/lib/words/unit-names';
import type { Crew } from './crew-language';

/** The units of a room by its released sheet, run by run: "Sink wall: Sink 36". */
export function unitChoices(
  stop: StopView,
  roomId: string,
  crew: Pick<Crew, 'language' | 'region'>,
): { id: string; words: string }[] {
  const sheet = stop.sheets.find(({ wallBook }) => wallBook.room.id === roomId);
  return (sheet?.runs ?? []).flatMap((run) =>
    run.units.map((unit, at) => ({
      id: unit.id,
      words: `${run.name}: ${at + 1}. ${unitIn(unit, crew)}`,
    })),
  );
}

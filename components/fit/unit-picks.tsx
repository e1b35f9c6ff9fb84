import type { Run, Unit, UnitKind } from '@/lib/contracts/runs';
import type { FitRules } from '@/lib/contracts/shop-rules';
import { newUnit } from '@/lib/sheet/new-run';
import { unitKindName } from '@/lib/sheet/unit-words';
import { formatLength } from '@/lib/units/format-length';
import { InFractions } from './in-fractions';

/** What stands in a run of each level, the commonest first. */
const kinds: Record<Run['level'], readonly UnitKind[]> = {
  base: ['base', 'drawers', 'sink', 'dishwasher', 'range', 'corner', 'panel', 'open'],
  wall: ['wall', 'hood', 'corner', 'panel', 'open'],
  tall: ['tall', 'refrigerator', 'panel', 'open'],
};

type UnitPicksProps = { level: Run['level']; rules: FitRules; onPick: (unit: Unit) => void };

/** Each kind at the width it is most often built to: one touch sets it at the right end of the run. */
export function UnitPicks({ level, rules, onPick }: UnitPicksProps) {
  return (
    <fieldset className="mt-2">
      <legend className="text-note text-graphite">Add at the right</legend>
      <div className="mt-1 flex flex-wrap gap-1.5">
        {kinds[level].map((kind) => {
          const unit = newUnit(rules, { id: kind, kind });
          return (
            <button
              key={kind}
              type="button"
              onClick={() => onPick({ ...unit, id: crypto.randomUUID() })}
              className="min-h-9 rounded border border-graphite px-2.5 hover:border-pine hover:bg-tint max-sm:min-h-thumb"
            >
              {unitKindName(kind, rules.region)}{' '}
              <b>
                <InFractions words={formatLength(unit.widthMm, rules)} />
              </b>
            </button>
          );
        })}
      </div>
    </fieldset>
  );
}

import { InFractions } from '@/components/fit/in-fractions';
import { TitleBlock } from '@/components/ui/title-block';
import { VerdictNote } from '@/components/ui/verdict-note';
import type { SheetView } from '@/lib/contracts/rooms';

/** What is other than on the revision before, and why it went out with points open. */
export function SheetChanges({ sheet }: { sheet: SheetView }) {
  const { release, overrideReason } = sheet;
  return (
    <>
      {release.changes.length > 0 ? (
        <section>
          <TitleBlock level={3} title="Changed since the revision before" />
          <ul className="list-disc py-1 pl-5 text-note">
            {release.changes.map((words) => (
              <li key={words}>
                <InFractions words={words} />
              </li>
            ))}
          </ul>
        </section>
      ) : null}
      {overrideReason ? (
        <VerdictNote kind="close" word="released with points open">
          {overrideReason}
        </VerdictNote>
      ) : null}
    </>
  );
}

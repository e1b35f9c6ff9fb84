import { EmptyState } from '@/components/ui/empty-state';
import { TitleBlock } from '@/components/ui/title-block';
import type { RuleHistoryLine } from '@/lib/contracts/rule-changes';
import { ChangeTable } from './change-table';

/** Who changed which rule, newest first. */
export function RuleHistory({ lines }: { lines: RuleHistoryLine[] }) {
  return (
    <section>
      <TitleBlock title="Changed before" meta={`${lines.length}`} />
      {lines.length === 0 ? (
        <EmptyState title="Nothing was changed yet">
          Each change is kept here: who, when, from what to what.
        </EmptyState>
      ) : (
        lines.map((line) => (
          <details key={line.id} className="border-b border-rule py-2">
            <summary className="cursor-pointer">
              {line.atWords}, {line.who}: {line.changes.map(({ label }) => label).join(', ')}
            </summary>
            <ChangeTable changes={line.changes} />
          </details>
        ))
      )}
    </section>
  );
}

'use client';

import { useFormRequest } from '@/components/door/use-form-request';
import { askServer } from '@/components/shell/ask-server';
import { Button } from '@/components/ui/button';
import { EmptyState } from '@/components/ui/empty-state';
import { FormError } from '@/components/ui/form-error';
import { TitleBlock } from '@/components/ui/title-block';
import type { RuleHistoryLine } from '@/lib/contracts/rule-changes';
import type { ChangeShopRulesInput, ShopSettings } from '@/lib/contracts/shop-rules';
import { apiPaths } from '@/lib/paths';
import { ChangeTable } from './change-table';
import { useRuleChange } from './use-rule-change';

type RuleHistoryProps = { lines: RuleHistoryLine[]; settings: ShopSettings; mayChange: boolean };

/** Who changed which rule, newest first; each can be put back, and what came after it stays. */
export function RuleHistory({ lines, settings, mayChange }: RuleHistoryProps) {
  const { look, dialog } = useRuleChange(settings);
  const putBack = useFormRequest(
    async ({ changeId = '' }) => {
      await look(await askServer<ChangeShopRulesInput>(apiPaths.ruleChangeBack(changeId)));
    },
    () => putBack.rest(),
  );
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
            {mayChange ? (
              <Button
                look="plain"
                className="-ml-3.5"
                onClick={() => void putBack.run({ changeId: line.id })}
              >
                Put it back as it was before
              </Button>
            ) : null}
          </details>
        ))
      )}
      <FormError problem={putBack.problem} shownFields={[]} />
      {dialog}
    </section>
  );
}

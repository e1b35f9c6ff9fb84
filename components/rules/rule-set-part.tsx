'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { askServer, problemOf } from '@/components/shell/ask-server';
import { Button } from '@/components/ui/button';
import { FormError } from '@/components/ui/form-error';
import { SelectField } from '@/components/ui/select-field';
import { TitleBlock } from '@/components/ui/title-block';
import { showToast } from '@/components/ui/toast-store';
import type { RulePreview } from '@/lib/contracts/rule-changes';
import type { OwnRuleSet } from '@/lib/contracts/rule-sets';
import type { FitRules } from '@/lib/contracts/shop-rules';
import { copyRuleSet } from '@/lib/measure/rules/copy-rule-set';
import { PUBLISHED_RULE_SETS } from '@/lib/measure/rules/rule-sets';
import { shopRuleSet } from '@/lib/measure/rules/shop-own';
import { apiPaths } from '@/lib/paths';
import type { ProblemDetails } from '@/lib/problem-details';
import { ChangePreview } from './change-preview';
import { LimitTable } from './limit-table';

/** Which limits give the verdicts: a published set, the shop's own, or a copy of either with other figures. */
export function RuleSetPart({ fit, mayChange }: { fit: FitRules; mayChange: boolean }) {
  const router = useRouter();
  const [picked, setPicked] = useState(fit.ruleSet);
  const [own, setOwn] = useState<OwnRuleSet[]>(fit.ownRuleSets ?? []);
  const [preview, setPreview] = useState<RulePreview | null>(null);
  const [problem, setProblem] = useState<ProblemDetails | null>(null);
  const [isBusy, setIsBusy] = useState(false);
  const all = [...PUBLISHED_RULE_SETS, ...own];
  const set = all.find(({ id }) => id === picked) ?? shopRuleSet(fit);
  const editable = own.find(({ id }) => id === picked) ?? null;
  const isChanged =
    picked !== fit.ruleSet || JSON.stringify(own) !== JSON.stringify(fit.ownRuleSets ?? []);

  const copy = () => {
    const made = copyRuleSet(set, `own-${crypto.randomUUID().slice(0, 8)}`);
    setOwn([...own, made]);
    setPicked(made.id);
  };
  const remove = () => {
    setOwn(own.filter(({ id }) => id !== picked));
    setPicked('shop');
  };
  const change = (changed: OwnRuleSet) =>
    setOwn(own.map((one) => (one.id === changed.id ? changed : one)));
  const body = { fit: { ...fit, ruleSet: picked, ownRuleSets: own } };
  const send = async (work: () => Promise<void>) => {
    setIsBusy(true);
    setProblem(null);
    try {
      await work();
    } catch (caught) {
      setPreview(null);
      setProblem(problemOf(caught));
    }
    setIsBusy(false);
  };
  const look = () =>
    send(async () =>
      setPreview(await askServer<RulePreview>(apiPaths.rulesPreview(), { method: 'POST', body })),
    );
  const save = () =>
    send(async () => {
      await askServer(apiPaths.rules(), { method: 'PATCH', body });
      setPreview(null);
      showToast({ text: 'Saved. Released sheets keep the limits they were made by.' });
      router.refresh();
    });

  return (
    <section>
      <TitleBlock title="Limits that give the verdicts" meta={set.name} />
      <div className="flex flex-wrap items-end gap-3 py-3">
        <SelectField
          label="Rule set"
          value={picked}
          disabled={!mayChange}
          onChange={(event) => setPicked(event.target.value)}
          options={[
            { value: 'shop', label: 'The shop’s own' },
            ...all.map(({ id, name }) => ({ value: id, label: name })),
          ]}
        />
        {mayChange ? (
          <Button look="line" onClick={copy}>
            Copy it to edit
          </Button>
        ) : null}
        {mayChange && editable ? (
          <Button look="line" onClick={remove}>
            Remove this copy
          </Button>
        ) : null}
      </div>
      <LimitTable set={set} unit={fit.unit} editable={editable} onChange={change} />
      <FormError problem={problem} shownFields={[]} />
      {mayChange && isChanged ? (
        <Button className="mt-3" onClick={look} busyText={isBusy ? 'Looking…' : undefined}>
          See what this changes
        </Button>
      ) : null}
      {preview ? (
        <ChangePreview
          preview={preview}
          isBusy={isBusy}
          onSave={save}
          onClose={() => setPreview(null)}
        />
      ) : null}
    </section>
  );
}

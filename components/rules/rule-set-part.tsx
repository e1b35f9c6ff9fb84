'use client';

import { useState } from 'react';
import { useFormRequest } from '@/components/door/use-form-request';
import { Button } from '@/components/ui/button';
import { FormError } from '@/components/ui/form-error';
import { SelectField } from '@/components/ui/select-field';
import { TextField } from '@/components/ui/text-field';
import { TitleBlock } from '@/components/ui/title-block';
import type { OwnRuleSet } from '@/lib/contracts/rule-sets';
import type { ShopSettings } from '@/lib/contracts/shop-rules';
import { copyRuleSet } from '@/lib/measure/rules/copy-rule-set';
import { PUBLISHED_RULE_SETS } from '@/lib/measure/rules/rule-sets';
import { shopRuleSet } from '@/lib/measure/rules/shop-own';
import { LimitTable } from './limit-table';
import { useRuleChange } from './use-rule-change';

type RuleSetPartProps = { settings: ShopSettings; mayChange: boolean };

/** Which limits give the verdicts: a published set, the shop's own, or a copy of either with other figures. */
export function RuleSetPart({ settings, mayChange }: RuleSetPartProps) {
  const { fit } = settings;
  const { look, dialog } = useRuleChange(settings);
  const [picked, setPicked] = useState(fit.ruleSet);
  const [own, setOwn] = useState<OwnRuleSet[]>(fit.ownRuleSets ?? []);
  const form = useFormRequest(
    () => look({ fit: { ...fit, ruleSet: picked, ownRuleSets: own } }),
    () => form.rest(),
  );
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
          <>
            <TextField
              label="Called"
              value={editable.name}
              maxLength={80}
              onChange={(event) => change({ ...editable, name: event.target.value })}
            />
            <Button look="line" onClick={remove}>
              Remove this copy
            </Button>
          </>
        ) : null}
      </div>
      <LimitTable
        set={set}
        unit={fit.unit}
        region={fit.region}
        editable={editable}
        onChange={change}
      />
      <FormError problem={form.problem} shownFields={[]} />
      {mayChange && isChanged ? (
        <Button
          className="mt-3"
          onClick={() => void form.run({})}
          busyText={form.isBusy ? 'Looking…' : undefined}
        >
          See what this changes
        </Button>
      ) : null}
      {dialog}
    </section>
  );
}

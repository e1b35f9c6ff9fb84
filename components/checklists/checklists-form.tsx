'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { askServer, problemOf } from '@/components/shell/ask-server';
import { Button } from '@/components/ui/button';
import { SelectField } from '@/components/ui/select-field';
import { TextareaField } from '@/components/ui/textarea-field';
import { showToast } from '@/components/ui/toast-store';
import type { ChecklistRules } from '@/lib/contracts/checklists';
import { checklistText, parseChecklist } from '@/lib/days/checklist-text';
import { checklistOf, usualChecklists } from '@/lib/days/checklists';
import { apiPaths } from '@/lib/paths';
import { type VisitKind, visitKinds } from '@/lib/schedule/visit-kind';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';

type ChecklistsFormProps = { own: ChecklistRules; mayChange: boolean };

/** The shop's lists, one kind of visit at a time, as lines of text. */
export function ChecklistsForm({ own, mayChange }: ChecklistsFormProps) {
  const router = useRouter();
  const [kind, setKind] = useState<VisitKind>('install');
  const [texts, setTexts] = useState<Partial<Record<VisitKind, string>>>({});
  const [isBusy, setIsBusy] = useState(false);
  const before = checklistOf(kind, own);
  const text = texts[kind] ?? checklistText(before);
  const { items, problems } = parseChecklist(text, [...before, ...usualChecklists[kind]]);

  const save = async (checklists: ChecklistRules) => {
    setIsBusy(true);
    try {
      await askServer(apiPaths.rules(), { method: 'PATCH', body: { checklists } });
      setTexts({});
      showToast({ text: 'Saved. Crews see it with their next day.' });
      router.refresh();
    } catch (caught) {
      showToast({ text: problemOf(caught).title, isProblem: true });
    } finally {
      setIsBusy(false);
    }
  };
  const asUsual = () => {
    const { [kind]: _dropped, ...others } = own;
    void save(others);
  };

  return (
    <div className="flex max-w-3xl flex-col gap-4 py-4">
      <SelectField
        label="Kind of visit"
        value={kind}
        options={visitKinds.map((value) => ({ value, label: visitKindWords[value] }))}
        onChange={(event) => {
          const chosen = visitKinds.find((known) => known === event.target.value);
          if (chosen) setKind(chosen);
        }}
      />
      <TextareaField
        label="Lines"
        hint="One line each, under # on arrival, # at work or # before leaving. ! before a caution of the trade; the Spanish after a bar."
        value={text}
        readOnly={!mayChange}
        rows={18}
        error={problems[0]?.message}
        onChange={(event) => setTexts({ ...texts, [kind]: event.target.value })}
      />
      {mayChange ? (
        <div className="flex flex-wrap gap-2">
          <Button
            disabled={problems.length > 0}
            busyText={isBusy ? 'Saving…' : undefined}
            onClick={() => void save({ ...own, [kind]: items })}
          >
            Save the {visitKindWords[kind].toLowerCase()} list, {items.length} lines
          </Button>
          {own[kind] ? (
            <Button look="plain" onClick={asUsual}>
              Back to the usual list
            </Button>
          ) : null}
        </div>
      ) : null}
    </div>
  );
}

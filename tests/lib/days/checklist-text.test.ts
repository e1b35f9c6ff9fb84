import { describe, expect, it } from 'vitest';
import { checklistText, parseChecklist } from '@/lib/days/checklist-text';
import { usualChecklists } from '@/lib/days/checklists';
import { visitKinds } from '@/lib/schedule/visit-kind';

describe('a checklist as a shop types it', () => {
  it.each(visitKinds)('reads the usual list of a %s back as it was', (kind) => {
    const list = usualChecklists[kind];
    const { items, problems } = parseChecklist(checklistText(list), list);
    expect(problems).toEqual([]);
    expect(items.map(({ key }) => key).sort()).toEqual(list.map(({ key }) => key).sort());
    expect(new Set(items.map((one) => JSON.stringify(one)))).toEqual(
      new Set(list.map((one) => JSON.stringify(one))),
    );
  });

  it('gives a new line a key of its own, and a line that stays its old one', () => {
    const before = usualChecklists.return;
    const text = `${checklistText(before)}\nDoor stops on | Topes puestos\n! Gas tested`;
    const { items } = parseChecklist(text, before);
    expect(items.at(-2)).toEqual({
      key: 'door-stops-on',
      words: { en: 'Door stops on', es: 'Topes puestos' },
      when: 'before-leaving',
    });
    expect(items.at(-1)).toMatchObject({ key: 'gas-tested', isCaution: true });
    expect(items.slice(0, -2).map(({ key }) => key)).toEqual(
      expect.arrayContaining(before.map(({ key }) => key)),
    );
  });

  it('refuses a line that stands there twice, and keeps the rest', () => {
    const { items, problems } = parseChecklist('Swept\nSwept\n\n|nothing', []);
    expect(items).toHaveLength(1);
    expect(problems).toMatchObject([{ code: 'line-twice' }]);
  });
});

import type { ChecklistItem } from '@/lib/contracts/checklists';
import { type Problem, problem } from '@/lib/problem';

const headings: Record<ChecklistItem['when'], string> = {
  'on-arrival': '# on arrival',
  'at-work': '# at work',
  'before-leaving': '# before leaving',
};
const times = Object.keys(headings) as ChecklistItem['when'][];

/**
 * A checklist as a shop types it: a heading for each time, one line an item, "!" before a caution, and the
 * Spanish after a bar.
 *
 * Example: "# at work", "! Looked for cables | Buscamos cables".
 */
export function checklistText(items: readonly ChecklistItem[]): string {
  return times
    .flatMap((when) => [
      headings[when],
      ...items
        .filter((item) => item.when === when)
        .map(({ words, isCaution }) =>
          [`${isCaution ? '! ' : ''}${words.en}`, words.es].filter(Boolean).join(' | '),
        ),
    ])
    .join('\n');
}

/**
 * The items that a text makes. A line that reads as before keeps its key, so that answers given to it stand.
 *
 * Edge: lines before any heading are of work; empty lines are left out; the same line twice is refused.
 * Problems: `line-twice`, `line-too-long`.
 */
export function parseChecklist(
  text: string,
  before: readonly ChecklistItem[],
): { items: ChecklistItem[]; problems: Problem[] } {
  const items: ChecklistItem[] = [];
  const problems: Problem[] = [];
  let when: ChecklistItem['when'] = 'at-work';
  for (const line of text.split('\n').map((one) => one.trim())) {
    const heading = times.find((time) => headings[time] === line.toLowerCase());
    if (heading) when = heading;
    if (heading || line === '') continue;
    const isCaution = line.startsWith('!');
    const [en = '', es = ''] = line
      .replace(/^!\s*/, '')
      .split('|')
      .map((part) => part.trim());
    if (en === '') continue;
    if (en.length > 200 || es.length > 200) {
      problems.push(problem('line-too-long', `"${en.slice(0, 40)}…" is too long for one line.`));
      continue;
    }
    if (items.some(({ words }) => words.en === en)) {
      problems.push(problem('line-twice', `"${en}" stands there twice.`));
      continue;
    }
    const known = before.find(({ words }) => words.en === en)?.key;
    const key = known ?? freeKey(en, [...before, ...items]);
    items.push({ key, words: { en, es }, when, ...(isCaution ? { isCaution } : {}) });
  }
  return { items, problems };
}

/** "Doors and drawers even" is "doors-and-drawers-even", or with a number where that is taken. */
function freeKey(words: string, taken: readonly ChecklistItem[]): string {
  const stem =
    words
      .toLowerCase()
      .normalize('NFD')
      .replace(/[^a-z0-9]+/g, '-')
      .replace(/^-|-$/g, '')
      .slice(0, 50) || 'line';
  const isTaken = (key: string) => taken.some((item) => item.key === key);
  if (!isTaken(stem)) return stem;
  let number = 2;
  while (isTaken(`${stem}-${number}`)) number += 1;
  return `${stem}-${number}`;
}

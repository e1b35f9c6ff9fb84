import { createHash } from 'node:crypto';
import type { NumbersFileInput } from '@/lib/contracts/numbers';
import { csvText } from '@/lib/export/csv';
import { figureWords } from '@/lib/numbers/figure-words';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import type { FileAnswer } from '@/server/base/handle-file';
import { getNumbers } from './get-numbers';

/** The jobs behind one figure, for a spreadsheet. */
export async function getNumbersFile(
  ctx: PersonContext,
  { figure: key, days }: NumbersFileInput,
): Promise<FileAnswer> {
  mustBeAllowed(ctx, 'numbers:read');
  const { figures, from, until, currency } = await getNumbers(ctx, { days });
  const figure = figures.find((one) => one.key === key);
  const unit = figure?.unit === 'money' ? currency : (figure?.unit ?? '');
  const text = csvText([
    ['Job', 'Day', figureWords[key].name, unit],
    ...(figure?.lines ?? []).map(({ jobNumber, on, words, value }) => [
      jobNumber,
      on,
      words,
      value,
    ]),
  ]);
  const bytes = Buffer.from(text);
  return {
    name: `${key}-${from}-to-${until}.csv`,
    mediaType: 'text/csv; charset=utf-8',
    bytes: bytes.byteLength,
    mark: createHash('sha256').update(bytes).digest('hex'),
    isSaved: true,
    open: async () => new Blob([bytes]).stream(),
  };
}

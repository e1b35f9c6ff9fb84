import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { csvText } from '@/lib/export/csv';
import { readStrictCsv } from '../../help/strict-csv';

const withoutMark = (text: string) => text.replace(/^\uFEFF/, '');

describe('csvText', () => {
  it('marks the text as UTF-8 and ends every line with CR LF', () => {
    expect(csvText([['piece'], ['A–B']])).toBe('\uFEFFpiece\r\nA–B\r\n');
  });

  it('quotes commas, quotation marks, line breaks and outer spaces', () => {
    expect(withoutMark(csvText([['a,b', '1/2"', 'two\r\nlines', ' led']]))).toBe(
      '"a,b","1/2""","two\r\nlines"," led"\r\n',
    );
  });

  it.each(['=1+1', '+1+1', '-1+cmd', '-', '@sum', '\tx', '\rx', '\nx', '＝1'])(
    'keeps a spreadsheet from running %j',
    (words) => {
      const [[cell] = []] = readStrictCsv(withoutMark(csvText([[words]])));
      expect(cell).toBe(`'${words}`);
    },
  );

  it.each(['+12125550143', '-58.3073'])('leaves %s as it is: it can only be a number', (words) => {
    expect(withoutMark(csvText([[words]]))).toBe(`${words}\r\n`);
  });

  it('writes numbers plainly, negative ones too, and nothing for what is no number', () => {
    const numbers = [-2.5, 1e-7, -1e-9, 63.50004, 1234567.8, Number.NaN, Number.POSITIVE_INFINITY];
    expect(withoutMark(csvText([[...numbers, null]]))).toBe('-2.5,0,0,63.5,1234567.8,,,\r\n');
  });

  it('reads back as it was, by a reader that allows nothing beside RFC 4180', () => {
    const cell = fc.string({ unit: 'grapheme', maxLength: 12 });
    const rows = fc
      .integer({ min: 1, max: 5 })
      .chain((width) =>
        fc.array(fc.array(cell, { minLength: width, maxLength: width }), { minLength: 1 }),
      );
    fc.assert(
      fc.property(rows, (table) => {
        const back = readStrictCsv(withoutMark(csvText(table)));
        const guarded = table.map((row) =>
          row.map((words) =>
            /^[=+\-@\t\r\n＝＋－＠]/.test(words) && !/^[+-]\d+(\.\d+)?$/.test(words)
              ? `'${words}`
              : words,
          ),
        );
        expect(back).toEqual(guarded);
      }),
    );
  });
});

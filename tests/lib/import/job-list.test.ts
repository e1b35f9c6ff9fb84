import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { decodeText } from '@/lib/import/decode-text';
import { findSeparator } from '@/lib/import/find-separator';
import { guessColumns, jobColumns, jobColumnWords } from '@/lib/import/job-columns';
import { readJobRow, rowProblemWords } from '@/lib/import/read-job-row';
import { plainCell, readDate, readNumber, readYesNo } from '@/lib/import/read-value';

describe('the text of a list', () => {
  it.each([
    ['UTF-8 with its mark', [0xef, 0xbb, 0xbf, 0xc3, 0xbc], 'UTF-8', 'ü'],
    ['UTF-8 without one', [0xc3, 0xbc], 'UTF-8', 'ü'],
    ['Windows-1252', [0x4d, 0xfc, 0x80], 'Windows-1252', 'Mü€'],
    ['UTF-16 of a little-endian machine', [0xff, 0xfe, 0xfc, 0x00], 'UTF-16', 'ü'],
    ['UTF-16 of a big-endian machine', [0xfe, 0xff, 0x00, 0xfc], 'UTF-16', 'ü'],
  ])('is read from %s', (_, bytes, encoding, text) => {
    expect(decodeText(Uint8Array.from(bytes))).toEqual({ encoding, text });
  });

  it('survives any bytes', () => {
    fc.assert(
      fc.property(fc.uint8Array({ maxLength: 200 }), (bytes) => {
        expect(typeof decodeText(bytes).text).toBe('string');
      }),
    );
  });

  it.each([
    ['Name,Phone\nAda,1\n', ','],
    ['Name;Phone;Town\n"Ada; the first";1;X\n', ';'],
    ['Name\tPhone\nAda, Bo\t1\n', '\t'],
    ['Name;Amount\nAda;1,5\nBo;2,5\n', ';'],
    ['"a\n;b",c\nd,e\n', ','],
    ['"Name"\t"Street"\r\n"Ada"\t"1\nrear"\r\n', '\t'],
    ['Name\nAda\n', ','],
    ['', ','],
  ])('%j is divided by %j', (text, separator) => {
    expect(findSeparator(text)).toBe(separator);
  });
});

describe('the headings of a list', () => {
  it('are known by the words of the export, and by what others call them', () => {
    expect(guessColumns(jobColumns.map((column) => jobColumnWords[column]))).toEqual([
      ...jobColumns,
    ]);
    expect(guessColumns(['Client Name', 'E-Mail', 'ZIP', 'Código postal', 'Colour'])).toEqual([
      'customer',
      'email',
      'postcode',
      null,
      null,
    ]);
  });
});

describe('a cell of a list', () => {
  it.each([
    ['5/12/26', 'US', '2026-05-12'],
    ['5/12/26', 'UK', '2026-12-05'],
    ['12.05.2026', 'US', '2026-05-12'],
    ['2026-05-12', 'EU', '2026-05-12'],
    ['31/2/2026', 'UK', null],
    ['1-2/2026', 'UK', null],
    ['soon', 'UK', null],
  ] as const)('with the date %s in %s is %s', (text, region, date) => {
    expect(readDate(text, region)).toBe(date);
  });

  it('with a number takes a decimal comma, and no words', () => {
    expect([
      readNumber('-58,31'),
      readNumber('41.2'),
      readNumber('1,000.5'),
      readNumber('ten'),
    ]).toEqual([-58.31, 41.2, null, null]);
    expect([readYesNo('Sí'), readYesNo(''), readYesNo('perhaps')]).toEqual([true, false, null]);
  });

  it('is freed of the apostrophe that keeps a spreadsheet from running it, and of no other', () => {
    expect([plainCell(" '+12125550147 "), plainCell("'=1+1"), plainCell("'tis")]).toEqual([
      '+12125550147',
      '=1+1',
      "'tis",
    ]);
  });
});

describe('a row of a list', () => {
  it('begins a job of which nobody is taken to have agreed to anything', () => {
    const { job, problems } = readJobRow(
      { customer: 'Robin Testwood', phone: '(212) 555-0147', street: '12 Alder Row', hasLift: 'x' },
      'US',
    );
    expect(problems).toEqual([]);
    expect(job).toMatchObject({
      title: 'New enquiry',
      customer: { phone: '+12125550147', mayText: false, mayEmail: false, language: 'en' },
      site: { hasLift: true, latitude: null },
    });
  });

  it('says in words what is wrong, column by column', () => {
    const { job, problems } = readJobRow(
      {
        phone: '12',
        email: 'nobody',
        street: '',
        roomCount: 'two',
        siteReadyOn: 'soon',
        language: 'fr',
      },
      'US',
    );
    expect(job).toBeNull();
    expect(problems.map(rowProblemWords)).toEqual(
      expect.arrayContaining([
        'Customer: Give the customer a name.',
        'E-mail: That is no e-mail address.',
        'Street: Give the street and number.',
        'Rooms: This is no number: "two".',
        'Site ready on: This is no date: "soon".',
        'Language: Write English or Spanish: "fr".',
      ]),
    );
    expect(problems.find(({ column }) => column === 'phone')).toBeDefined();
    expect(new Set(problems.map(({ column }) => column)).size).toBe(problems.length);
  });

  it('of any texts is a job or has a problem, never both and never neither', () => {
    const cells = fc.record(
      Object.fromEntries(jobColumns.map((column) => [column, fc.string({ maxLength: 30 })])),
      { requiredKeys: [] },
    );
    fc.assert(
      fc.property(cells, fc.constantFrom('US', 'UK', 'AU', 'EU'), (row, region) => {
        const { job, problems } = readJobRow(row, region);
        expect(job === null).toBe(problems.length > 0);
      }),
      { numRuns: 300 },
    );
  });
});

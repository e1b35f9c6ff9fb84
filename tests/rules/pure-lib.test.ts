import { describe, expect, it } from 'vitest';
import { sourceFiles, withoutComments } from '../help/source-files';

/** What would let the same readings give another answer tomorrow, or on another machine. */
const impure: [name: string, pattern: RegExp, example: string][] = [
  [
    'the clock',
    /\bDate\.now\b|\bperformance\.now\b|\bnew Date\(\s*\)|[^.\w]Date\(\s*\)/,
    'new Date()',
  ],
  ['chance', /\bMath\.random\b|\brandomUUID\b|\bgetRandomValues\b/, 'Math.random()'],
  ['a timer', /\bset(?:Timeout|Interval|Immediate)\(/, 'setTimeout(work, 10)'],
  ['the process', /\bprocess\.|\bglobalThis\b/, 'process.env.TZ'],
  ['the network', /\bfetch\(|\bXMLHttpRequest\b|\bWebSocket\b/, 'fetch(url)'],
  [
    'the browser',
    /\blocalStorage\b|\bindexedDB\b|\bnavigator\.|\bwindow\.(?:inner|location|add)|\bdocument\.(?:query|body|add)/,
    'localStorage',
  ],
  ['the console', /\bconsole\./, 'console.log(value)'],
  ['the machine’s own zone', /\.get(?:Hours|Date|Day|Month|FullYear)\(\)/, 'now.getHours()'],
  ['a loop-hole in the types', /\bas any\b|@ts-ignore|@ts-expect-error/, 'x as any'],
];

describe('lib is pure', () => {
  const files = sourceFiles('lib');

  it.each(impure)('nothing in it asks %s', (_name, pattern, example) => {
    expect(pattern.test(example)).toBe(true);
    const found = files.filter(({ text }) => pattern.test(withoutComments(text)));
    expect(found.map(({ file }) => file)).toEqual([]);
  });

  it('reads every file of it', () => {
    expect(files.length).toBeGreaterThan(100);
  });
});

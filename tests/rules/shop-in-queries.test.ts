import { describe, expect, it } from 'vitest';
import { sourceFiles, withoutComments } from '../help/source-files';

const folders = [
  'people',
  'shops',
  'jobs',
  'walls',
  'sheets',
  'messages',
  'visits',
  'snags',
  'days',
  'files',
  'keeping',
  'numbers',
  'programs',
];

/** Queries that belong to no one shop, by the start of their file's name; each with the reason. */
const ofNoShop: Record<string, string> = {
  'server/people/create-user.ts': 'a sign-in may belong to two shops',
  'server/people/list-demo-people.ts': 'by the e-mails of the invented shop',
  'server/shops/create-shop.ts': 'makes the shop',
  'server/visits/lapse-holds.ts': 'the clock lets holds go in every shop alike',
  'server/jobs/place-due-sites.ts':
    'the worker looks addresses up for every shop; each row it takes names its own',
  'server/keeping/forget-old.ts': 'each shop by its own rule',
  'server/keeping/start-sample.ts': 'whether the asker has a sample, whichever it is',
  'server/keeping/remove-sample.ts': 'the asker’s sample, whichever it is',
  'server/programs/send-deliveries.ts':
    'the worker tells for every shop; each row it takes names its own',
  'server/messages/claim-due.ts':
    'the worker sends for every shop; each row it takes names its own',
  'server/messages/hear-report.ts': 'the provider names the message, not the shop',
  'server/messages/told-together.ts':
    'its caller says which messages lead; those with them are of their shop by the foreign key',
  'server/messages/claim-unreported.ts':
    'the worker asks for every shop; each row it takes names its own',
  'server/messages/give-up.ts': 'its caller says which messages; each row it takes names its shop',
  'server/visits/notice-silence.ts':
    'the clock looks through every shop; each item it puts names its own',
  'server/visits/sms-sender.ts':
    'a text tells its number, not the shop; the newest told visit decides',
};

type Query = { file: string; words: string };

const namesShop = /shopId|shop\.id/;

/** A setting of this transaction's connection: no rows. */
const setsTheConnection = /^\.execute\(sql`select set_config\(/;

/**
 * Each statement that reads, changes or deletes rows, from its verb to its end. What is inserted names its
 * shop by its type: the column may not be empty.
 */
function queries(file: string, text: string): Query[] {
  const code = withoutComments(text);
  const starts = /\.(?:select|selectDistinct|update|delete)\(|\.execute\(/g;
  return [...code.matchAll(starts)]
    .filter(({ index }) => /(?:db|tx)\s*$/.test(code.slice(Math.max(0, index - 40), index)))
    .map(({ index }) => ({ file, words: code.slice(index, endOf(code, index)) }))
    .filter(({ words }) => !setsTheConnection.test(words));
}

/** Where the statement ends that goes on here: its semicolon, outside all brackets. */
function endOf(code: string, start: number): number {
  let depth = 0;
  for (let at = start; at < code.length; at += 1) {
    if ('([{'.includes(code[at] ?? '')) depth += 1;
    if (')]}'.includes(code[at] ?? '')) depth -= 1;
    if (depth < 0 || (depth === 0 && code[at] === ';')) return at;
  }
  return code.length;
}

/** Conditions and rows that are written once and used by name: those whose own lines name the shop. */
function namedParts(text: string): string[] {
  const code = withoutComments(text);
  return [...code.matchAll(/const (\w+) = /g)]
    .filter(({ index }) => namesShop.test(code.slice(index, endOf(code, index))))
    .map(([, name = '']) => name);
}

const carriesShop = ({ file, words }: Query, text: string) =>
  file in ofNoShop ||
  namesShop.test(words) ||
  namedParts(text).some((name) => new RegExp(`\\b${name}\\b`).test(words));

describe('every query in a room of the server carries the shop', () => {
  const files = sourceFiles(...folders.map((folder) => `server/${folder}`));

  it('finds the queries, and one without a shop', () => {
    expect(files.flatMap(({ file, text }) => queries(file, text)).length).toBeGreaterThan(60);
    const planted = 'await tx.select().from(jobs).where(eq(jobs.id, id));';
    const [query] = queries('planted.ts', planted);
    expect(query && carriesShop(query, planted)).toBe(false);
  });

  it('and each names it', () => {
    const without = files.flatMap(({ file, text }) =>
      queries(file, text).filter((query) => !carriesShop(query, text)),
    );
    expect(without).toEqual([]);
  });
});

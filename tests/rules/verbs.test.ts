import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { sourceFiles, withoutComments } from '../help/source-files';

/** Verbs that nobody signs in for, or that ask something else than a role; each with what guards it instead. */
const guardedOtherwise: Record<string, string> = {
  createShop: 'open: makes the shop and its owner; tries are counted',
  joinShop: 'the invitation is the permission; tries are counted',
  findInvitation: 'the invitation is the permission',
  listDemoPeople: 'empty outside the demo',
  signedInResponse: 'asks for the password',
  listMyShops: 'one’s own shops only',
  switchShop: 'one’s own shops only',
  bookingDays: 'reckons with what the context carries, and reads no row',
  readFeed: 'the address is the permission; guesses are counted',
  getCustomerVisit: 'the link is the permission',
  getCustomerCalendar: 'the link is the permission',
  getCustomerTimes: 'the link is the permission',
  holdByForm: 'the link is the permission',
  takeByForm: 'the link is the permission',
  hasCustomerCopy: 'the link is the permission',
  getCustomerCopy: 'the link is the permission',
  answerByForm: 'the link is the permission',
  handleSmsWebhook: 'the provider’s signature',
  hearSms: 'called behind handleSmsWebhook',
  hearReport: 'called behind handleSmsWebhook',
  openInterface: 'says how to ask, and nothing of any shop',
  readPhone: 'not there outside the demo',
  replyAsCustomer: 'not there outside the demo',
};

const rooms =
  'people|shops|jobs|walls|sheets|messages|visits|snags|days|files|numbers|keeping|programs|demo';

type Verb = { name: string; file: string };

/** What pages and routes call: every function that `app` imports from a room of the server. */
function verbs(): Verb[] {
  const found = new Map<string, Verb>();
  const imports = new RegExp(
    `import (type )?\\{([^}]*)\\} from '@/(server/(?:${rooms})/[^']+)'`,
    'g',
  );
  for (const { text } of sourceFiles('app')) {
    for (const [, isType, names = '', place = ''] of text.matchAll(imports)) {
      if (isType) continue;
      for (const name of names.split(',').map((part) => part.trim())) {
        if (name && !name.startsWith('type ')) found.set(name, { name, file: `${place}.ts` });
      }
    }
  }
  return [...found.values()];
}

/** The first statement of a function, or null where there is none of that name. */
function firstStatement(text: string, name: string): string | null {
  const code = withoutComments(text);
  const start = code.search(new RegExp(`export (?:async )?function ${name}\\b`));
  if (start < 0) return null;
  const body = code.slice(start).match(/\n?\)[^\n]*\{\n([^;]*;)|\{\n([^;]*;)/);
  return (body?.[1] ?? body?.[2] ?? '').trim();
}

describe('verbs of the server', () => {
  const all = verbs();
  const asked = all.filter(({ name }) => !(name in guardedOtherwise));

  it('are many', () => {
    expect(asked.length).toBeGreaterThan(20);
  });

  it.each(asked)('$name asks first whether the role may', ({ name, file }) => {
    expect(firstStatement(readFileSync(file, 'utf8'), name)).toMatch(
      /^mustBeAllowed\(ctx, '[a-z]+:[a-z-]+'\);$/,
    );
  });

  it('a verb that does something before it asks is found out', () => {
    const late = `export async function f(ctx: PersonContext) {\n  await read();\n  mustBeAllowed(ctx, 'jobs:read');\n}`;
    expect(firstStatement(late, 'f')).toBe('await read();');
  });

  it('the list of those guarded otherwise names no verb that is gone', () => {
    const names = new Set(all.map(({ name }) => name));
    expect(Object.keys(guardedOtherwise).filter((name) => !names.has(name))).toEqual([]);
  });
});

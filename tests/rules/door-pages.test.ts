import { readdirSync } from 'node:fs';
import { expect, it } from 'vitest';
import { config } from '@/proxy';

const pagesOf = (part: string) =>
  readdirSync(`app/${part}`, { withFileTypes: true })
    .filter((entry) => entry.isDirectory())
    .map(({ name }) => `/${name}/:path*`);

it('somebody without a session is shown the door before any page of the shop is drawn', () => {
  expect(config.matcher).toEqual([...pagesOf('(office)'), ...pagesOf('(phone)')].sort());
});

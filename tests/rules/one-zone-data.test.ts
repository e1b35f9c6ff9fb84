import { readFileSync } from 'node:fs';
import { expect, it } from 'vitest';

it('there is one copy of the zones’ data: of two, the one that is loaded first serves both, and may be years old', () => {
  const { packages } = JSON.parse(readFileSync('package-lock.json', 'utf8'));
  const copies = Object.keys(packages).filter((path) => path.endsWith('/moment-timezone'));
  expect(copies.filter((path) => !path.includes('@fullcalendar/'))).toEqual([
    'node_modules/moment-timezone',
  ]);
});

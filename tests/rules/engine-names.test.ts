import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import * as engine from '@/lib/measure';

const folders = ['tests/lib/measure', 'tests/lib/units', 'tests/reference'];
const tests = folders.flatMap((folder) =>
  readdirSync(folder)
    .filter((name) => name.endsWith('.test.ts'))
    .map((name) => readFileSync(join(folder, name), 'utf8')),
);
const names = Object.keys(engine);

describe('the public names of the engine', () => {
  it.each(names)('%s is called by a test', (name) => {
    const call = new RegExp(`\\b${name}\\(`);
    expect(tests.some((text) => call.test(text))).toBe(true);
  });

  it('are those that the design lists, and no other', () => {
    expect([...names].sort()).toEqual(listed.split(' ').sort());
  });
});

const listed =
  'parseLength formatLength roundBlankUp roundOpeningDown cornerAngle cornerOffset straightness ' +
  'straightedgeGap plumbOf setLine planeOf clearOpening fillRun suggestWidths scribeAllowance ' +
  'kickHeights tiltUp passesDoor turnsCorner studCatch collisions halfMitre crownMitre ' +
  'islandPlacement sheetCorrection closeTraverse adjustRoom findBlunder settle fitRoom ' +
  'whatIsMissing checkRule';

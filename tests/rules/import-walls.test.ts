import { spawnSync } from 'node:child_process';
import { cpSync, mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';

/** [file that imports, what it imports]; each must be refused. */
const violations: [string, string][] = [
  ['lib/measure/planted.ts', '@/server/base/env'],
  ['lib/measure/planted.ts', '@/components/ui/button'],
  ['lib/measure/planted.ts', '@/db/schema'],
  ['lib/measure/planted.ts', 'node:fs'],
  ['lib/measure/planted.ts', 'react'],
  ['db/planted.ts', '@/server/base/env'],
  ['db/planted.ts', '@/app/layout'],
  ['components/ui/planted.tsx', '@/db/schema'],
  ['components/ui/planted.tsx', '@/server/jobs/get-job'],
  ['components/ui/planted.tsx', 'drizzle-orm'],
  ['app/(office)/jobs/planted.tsx', '@/db/schema'],
  ['app/(office)/jobs/planted.tsx', 'drizzle-orm'],
  ['server/base/planted.ts', '@/server/jobs/get-job'],
  ['server/ports/planted.ts', '@/server/messages/send-due'],
  ['server/ports/planted.ts', '@/db/schema'],
  ['server/people/planted.ts', '@/server/shops/create-shop'],
  ['server/jobs/planted.ts', '@/server/walls/get-wall-book'],
  ['server/jobs/planted.ts', '@/components/ui/button'],
  ['server/walls/planted.ts', '@/server/sheets/get-fit'],
  ['server/sheets/planted.ts', '@/server/visits/book-visit'],
  ['server/messages/planted.ts', '@/server/visits/book-visit'],
  ['server/visits/planted.ts', '@/server/days/get-today'],
  ['server/visits/planted.ts', '@/server/snags/open-snag'],
  ['server/snags/planted.ts', '@/server/days/get-today'],
  ['server/files/planted.ts', '@/server/snags/open-snag'],
  ['server/visits/planted.ts', '@/server/keeping/erase-customer'],
  ['server/visits/planted.ts', '@/server/jobs/internal'],
  ['server/visits/planted.ts', '../jobs/get-job'],
];

/** What the walls let through; each must pass. */
const allowed: [string, string][] = [
  ['lib/measure/planted.ts', '@/lib/units/brands'],
  ['lib/contracts/planted.ts', 'zod'],
  ['server/visits/planted.ts', '@/server/messages/enqueue'],
  ['server/sheets/planted.ts', '@/server/walls/get-wall-book'],
  ['server/snags/planted.ts', '@/server/visits/lock-visit'],
  ['server/days/planted.ts', '@/server/snags/open-snag'],
  ['server/days/planted.ts', '@/server/sheets/get-sheet'],
  ['server/numbers/planted.ts', '@/server/visits/book-visit'],
  ['server/keeping/planted.ts', '@/server/files/get-file'],
  ['components/ui/planted.tsx', '@/lib/paths'],
  ['app/(office)/jobs/planted.tsx', '@/server/jobs/get-job'],
  ['db/planted.ts', 'drizzle-orm'],
];

describe('the walls between folders', () => {
  let folder = '';
  beforeAll(() => {
    folder = mkdtempSync(path.join(os.tmpdir(), 'setwell-walls-'));
    cpSync('biome.json', path.join(folder, 'biome.json'));
  });
  afterAll(() => rmSync(folder, { recursive: true, force: true }));

  function refuses(code: string, file: string): boolean {
    const place = path.join(folder, file);
    mkdirSync(path.dirname(place), { recursive: true });
    writeFileSync(place, code);
    const biome = path.resolve('node_modules/@biomejs/biome/bin/biome');
    const run = spawnSync(process.execPath, [biome, 'lint', '--reporter=json', file], {
      cwd: folder,
      encoding: 'utf8',
    });
    rmSync(place);
    return /noRestrictedImports|noProcessEnv/.test(run.stdout);
  }
  const importing = (target: string) => `import { x } from '${target}';\n\nexport const y = x;\n`;

  it.each(violations)('%s may not import %s', (file, target) => {
    expect(refuses(importing(target), file)).toBe(true);
  });

  it.each(allowed)('%s may import %s', (file, target) => {
    expect(refuses(importing(target), file)).toBe(false);
  });

  it('only server/base/env.ts reads the environment', () => {
    const code = 'export const port = process.env.PORT;\n';
    expect(refuses(code, 'server/jobs/planted.ts')).toBe(true);
    expect(refuses(code, 'server/base/env.ts')).toBe(false);
  });
});

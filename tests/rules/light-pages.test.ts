import { existsSync, readFileSync, statSync } from 'node:fs';
import path from 'node:path';
import { describe, expect, it } from 'vitest';

/** Pages for a stranger's, a customer's or a crew's phone: what the browser loads at first for them stays small. */
const lightPages = [
  'app/(front)/page.tsx',
  'app/(front)/check/page.tsx',
  'app/(door)/sign-in/page.tsx',
  'app/(door)/join/[invitationId]/page.tsx',
  'app/v/[token]/page.tsx',
  'app/(phone)/today/page.tsx',
  'app/(phone)/today/[visitId]/page.tsx',
  'app/(phone)/walls/[roomId]/page.tsx',
  'app/no-signal/page.tsx',
];
const heavy = /^(@tanstack\/|zod|ml-matrix|@fullcalendar\/|leaflet|react-leaflet|dexie|moment)/;

const root = path.resolve(__dirname, '../..');

describe('light pages', () => {
  it.each(lightPages.filter((page) => existsSync(path.join(root, page))))(
    '%s sends the browser no heavy library',
    (page) => {
      const found = [...clientRoots(page)].flatMap((file) => heavyImports(file));
      expect(found).toEqual([]);
    },
  );

  it('finds a heavy library where there is one', () => {
    expect(heavyImports('components/shell/job-search-query.ts')).toContain(
      'components/shell/job-search-query.ts: @tanstack/react-query',
    );
  });
});

/** Files under the page at which the browser's part begins. */
function clientRoots(page: string, seen = new Set<string>()): Set<string> {
  const roots = new Set<string>();
  const visit = (file: string) => {
    if (seen.has(file)) return;
    seen.add(file);
    if (/^\s*(['"])use client\1/.test(read(file))) roots.add(file);
    else for (const next of ownImports(file)) visit(next);
  };
  visit(page);
  return roots;
}

function heavyImports(start: string): string[] {
  const found: string[] = [];
  const seen = new Set<string>();
  const visit = (file: string) => {
    if (seen.has(file)) return;
    seen.add(file);
    for (const name of imports(file)) if (heavy.test(name)) found.push(`${file}: ${name}`);
    for (const next of ownImports(file)) visit(next);
  };
  visit(start);
  return found;
}

function ownImports(file: string): string[] {
  return imports(file).flatMap((name) => {
    const base = name.startsWith('@/')
      ? name.slice(2)
      : name.startsWith('.')
        ? path.join(path.dirname(file), name)
        : null;
    if (base === null) return [];
    const resolved = [base, `${base}.ts`, `${base}.tsx`, `${base}/index.ts`].find(isFile);
    return resolved && /\.tsx?$/.test(resolved) ? [resolved] : [];
  });
}

/** What a file imports to run: types are gone by then. */
function imports(file: string): string[] {
  const found = read(file).matchAll(/^(?:import|export)\s+(?!type\b)([^'";]*?from\s+)?'([^']+)'/gm);
  return [...found]
    .filter(([, names = '']) => !onlyTypes(names))
    .map(([, , name]) => name)
    .filter((name) => name !== undefined);
}

function onlyTypes(names: string): boolean {
  const inBraces = /^\{([^}]*)\}\s*from\s+$/.exec(names.trimStart())?.[1];
  const parts = inBraces?.split(',').filter((part) => part.trim() !== '');
  return parts?.every((part) => part.trim().startsWith('type ')) ?? false;
}

const isFile = (file: string) =>
  existsSync(path.join(root, file)) && statSync(path.join(root, file)).isFile();
const read = (file: string) => readFileSync(path.join(root, file), 'utf8');

import { existsSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { sourceFiles } from '../help/source-files';

/** Every address that answers requests, by each way of asking. */
const routes = sourceFiles('app')
  .filter(({ file }) => file.endsWith('/route.ts'))
  .flatMap(({ file, text }) => methodsOf(text).map((method) => [method, file] as const));

/** What only a build makes: asked through a running server by the browser tests. */
const askedByAddress: Record<string, string> = {
  'app/serwist/[path]/route.ts': '/serwist/sw.js',
};

describe('addresses that answer requests', () => {
  const tests = sourceFiles('tests').filter(({ file }) => !file.startsWith('tests/rules/'));

  it('are found', () => {
    expect(routes.length).toBeGreaterThan(25);
  });

  it.each(routes)('%s %s has a test that calls it', (method, route) => {
    const address = askedByAddress[route];
    const callers = tests.filter(({ text }) =>
      address ? text.includes(address) : importedFrom(text, route).includes(method),
    );
    expect(callers.map(({ file }) => file)).not.toEqual([]);
  });

  it('those asked by address are still there', () => {
    expect(Object.keys(askedByAddress).filter((file) => !existsSync(file))).toEqual([]);
  });

  it('count as tested only by the method that is imported', () => {
    const text = "import { GET as listRoute } from '@/app/api/jobs/route';";
    expect(importedFrom(text, 'app/api/jobs/route.ts')).toEqual(['GET']);
    expect(importedFrom(text, 'app/api/rooms/route.ts')).toEqual([]);
    const code = 'export const GET = a;\nexport const { POST, DELETE } = b;';
    expect(methodsOf(code)).toEqual(['GET', 'POST', 'DELETE']);
  });
});

function methodsOf(text: string): string[] {
  const exported = [
    ...text.matchAll(/^export (?:const|async function|function) (\w+|\{[^}]*\})/gm),
  ];
  return exported.flatMap(
    ([, names = '']) => names.match(/\b(?:GET|POST|PUT|PATCH|DELETE)\b/g) ?? [],
  );
}

/** The names that a test takes from a route, as the route calls them. */
function importedFrom(text: string, route: string): string[] {
  const module = `@/${route.replace(/\.ts$/, '')}`;
  return [...text.matchAll(/import\s+\{([^}]*)\}\s+from\s+'([^']+)'/g)]
    .filter(([, , name]) => name === module)
    .flatMap(([, names = '']) => names.split(','))
    .map((name) => name.trim().split(/\s+as\s+/)[0] ?? '');
}

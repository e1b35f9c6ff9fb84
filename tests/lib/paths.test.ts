import { describe, expect, it } from 'vitest';
import { apiPaths, paths, safeNext } from '@/lib/paths';

describe('paths', () => {
  it('encodes what people typed', () => {
    expect(apiPaths.jobSearch('o’neil & sons')).toBe(
      '/api/jobs?search=o%E2%80%99neil%20%26%20sons',
    );
    expect(paths.signIn('/jobs?on=1')).toBe('/sign-in?next=%2Fjobs%3Fon%3D1');
  });

  it('keeps a stranger’s slash inside its own part', () => {
    expect(paths.job('../rules')).toBe('/jobs/..%2Frules');
  });
});

describe('safeNext', () => {
  it('follows an address on this site', () => {
    expect(safeNext('/jobs/1?a=b#c', '/diary')).toBe('/jobs/1?a=b#c');
  });

  it.each([
    'https://evil.example',
    '//evil.example',
    '/\\evil.example',
    '/\t/evil.example',
    'javascript:alert(1)',
    'jobs',
    '',
    null,
    undefined,
  ])('does not follow %s', (next) => {
    expect(safeNext(next, '/diary')).toBe('/diary');
  });
});

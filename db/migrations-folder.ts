import path from 'node:path';

/** `drizzle/` beside the running program: `next start` and the tests both run from the project's root. */
export function migrationsFolder(): string {
  return path.resolve(/*turbopackIgnore: true*/ process.cwd(), 'drizzle');
}

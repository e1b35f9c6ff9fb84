import { copyFile, cp, readdir, rm, stat } from 'node:fs/promises';
import path from 'node:path';

/**
 * Photos, documents and the signing secret beside the copies of the database. A file never changes under its
 * name, so only new ones are copied; what was erased for a customer goes from here as well.
 */
export async function copyFiles({ from, to }: { from: string; to: string }): Promise<void> {
  const at = (folder: string, name: string) => path.join(/*turbopackIgnore: true*/ folder, name);
  if (await exists(at(from, 'secret'))) await copyFile(at(from, 'secret'), at(to, 'secret'));
  // A shop without files yet, or one whose disk is not there: nothing is taken away for that.
  if (!(await exists(at(from, 'files')))) return;
  await cp(at(from, 'files'), at(to, 'files'), { recursive: true, force: false });
  const copied = await readdir(at(to, 'files'), { recursive: true, withFileTypes: true });
  for (const entry of copied.filter((one) => one.isFile())) {
    const copy = at(entry.parentPath, entry.name);
    const original = at(at(from, 'files'), path.relative(at(to, 'files'), copy));
    if (!(await exists(original))) await rm(copy);
  }
}

async function exists(place: string): Promise<boolean> {
  return stat(place).then(
    () => true,
    () => false,
  );
}

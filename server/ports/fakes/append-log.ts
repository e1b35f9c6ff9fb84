import { appendFile, mkdir, open, readFile } from 'node:fs/promises';
import path from 'node:path';

/** A file of JSON lines that is only added to: what a fake received outlives its process. */
export type AppendLog<Entry> = {
  /** What was there when the log was opened. */
  entries: Entry[];
  /** Written in the order of the calls; resolves when the line is in the file. */
  append(entry: Entry): Promise<void>;
};

/** Opens or makes the file. A line torn by a crash is left where it is and skipped. */
export async function openAppendLog<Entry>(file: string): Promise<AppendLog<Entry>> {
  await mkdir(path.dirname(file), { recursive: true });
  await (await open(file, 'a')).close();
  const text = await readFile(file, 'utf8');
  if (text !== '' && !text.endsWith('\n')) await appendFile(file, '\n');
  let last: Promise<void> = Promise.resolve();
  return {
    entries: text.split('\n').flatMap(parseLine<Entry>),
    append(entry) {
      last = last.then(() => appendFile(file, `${JSON.stringify(entry)}\n`));
      return last;
    },
  };
}

function parseLine<Entry>(line: string): Entry[] {
  try {
    return line === '' ? [] : [JSON.parse(line) as Entry];
  } catch {
    return [];
  }
}

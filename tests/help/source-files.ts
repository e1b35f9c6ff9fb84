import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';

export type SourceFile = { file: string; text: string };

/** The TypeScript sources below some folders of the project, for rules that read code. */
export function sourceFiles(...folders: string[]): SourceFile[] {
  return folders.flatMap((folder) =>
    readdirSync(folder, { recursive: true, encoding: 'utf8' })
      .filter((name) => /\.tsx?$/.test(name))
      .sort()
      .map((name) => path.join(folder, name))
      .map((file) => ({ file, text: readFileSync(file, 'utf8') })),
  );
}

/** The same text with its comments blanked, line by line, so that words in them prove nothing. */
export function withoutComments(text: string): string {
  return text
    .replace(/\/\*[\s\S]*?\*\//g, (comment) => comment.replace(/[^\n]/g, ' '))
    .replace(/(^|[^:'"`])\/\/[^\n]*/g, '$1');
}

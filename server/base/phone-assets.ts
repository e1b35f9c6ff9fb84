import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { assetNamesIn } from '@/lib/sync/asset-names';

/** The phone's pages, and the page that stands in for all of them where there is no signal. */
const phonePages = [
  '(phone)/today/page',
  '(phone)/today/[visitId]/page',
  '(phone)/walls/[roomId]/page',
  'no-signal/page',
];

/**
 * Everything in the build that those pages load, at once or later, as `static/…`: what the build says
 * that a page needs, and what these files name in turn. Asked for while the build runs; empty where
 * nothing is built.
 */
export function phoneAssets(buildFolder: string): Set<string> {
  const found = new Set<string>();
  const textOf = (file: string) => {
    const place = path.join(/*turbopackIgnore: true*/ buildFolder, file);
    return existsSync(place) ? readFileSync(place, 'utf8') : '';
  };
  const add = (file: string) => {
    for (const name of assetNamesIn(textOf(file))) {
      if (found.has(name)) continue;
      found.add(name);
      if (/\.(?:js|css)$/.test(name)) add(name);
    }
  };
  for (const page of phonePages) {
    add(`server/app/${page}/build-manifest.json`);
    add(`server/app/${page}_client-reference-manifest.js`);
  }
  return found;
}

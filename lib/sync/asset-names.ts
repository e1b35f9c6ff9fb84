/**
 * The built files that a text names: a page's list of scripts, a script that loads others later, a style
 * with its fonts. Each once, from `static/` on.
 *
 * Edge: a font is named beside its style (`../media/…`), and is given as if from the top.
 * Example: `{"chunks":["/_next/static/chunks/1a.js"]}` names `static/chunks/1a.js`.
 */
export function assetNamesIn(text: string): string[] {
  const found = text.matchAll(
    /(?:static\/|\.\.\/(?=media\/))((?:chunks|media)\/[\w.~@+()[\]-]+?\.(?:js|css|woff2?))(?![\w.])/g,
  );
  return [...new Set([...found].map(([, name]) => `static/${name}`))];
}

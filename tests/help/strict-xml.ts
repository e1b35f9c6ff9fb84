export type XmlElement = {
  name: string;
  attributes: Record<string, string>;
  /** All text inside, tags left out. */
  text: string;
  depth: number;
};

const nameShape = '[A-Za-z_][\\w:.-]*';
const tag = new RegExp(
  `<(?:(/)(${nameShape})\\s*|(${nameShape})((?:\\s+${nameShape}="[^"<]*")*)\\s*(/?))>`,
  'y',
);
const attribute = new RegExp(`(${nameShape})="([^"<]*)"`, 'g');
const reference = /&(?!(?:amp|lt|gt|quot|apos|#\d+|#x[\dA-Fa-f]+);)/;
const entities: Record<string, string> = { amp: '&', lt: '<', gt: '>', quot: '"', apos: "'" };

/** Reads an XML document with elements, attributes and text; throws where it is not well formed. */
export function readStrictXml(document: string): XmlElement[] {
  const body = document.replace(/^<\?xml version="1\.0" encoding="UTF-8"\?>\n/, '');
  const all: XmlElement[] = [];
  const open: XmlElement[] = [];
  let at = 0;
  while (at < body.length) {
    if (body[at] !== '<') {
      const end = body.indexOf('<', at) < 0 ? body.length : body.indexOf('<', at);
      const words = decoded(body.slice(at, end));
      if (open.length === 0 && words.trim() !== '') throw new Error('text outside the root');
      for (const element of open) element.text += words;
      at = end;
      continue;
    }
    tag.lastIndex = at;
    const found = tag.exec(body);
    if (!found) throw new Error(`no tag at ${body.slice(at, at + 60)}`);
    const [whole, closing, closes, opens = '', attributes = '', empty] = found;
    at += whole.length;
    if (closing) {
      if (open.pop()?.name !== closes) throw new Error(`</${closes}> closes nothing`);
      continue;
    }
    if (open.length === 0 && all.length > 0) throw new Error('a second root');
    const element = { name: opens, attributes: read(attributes), text: '', depth: open.length };
    all.push(element);
    if (!empty) open.push(element);
  }
  if (open.length > 0) throw new Error(`<${open.at(-1)?.name}> is not closed`);
  return all;
}

function read(text: string): Record<string, string> {
  const attributes: Record<string, string> = {};
  for (const [, name = '', value = ''] of text.matchAll(attribute)) {
    if (name in attributes) throw new Error(`${name} twice`);
    attributes[name] = decoded(value);
  }
  return attributes;
}

function decoded(text: string): string {
  if (reference.test(text)) throw new Error(`a bare & in ${text.slice(0, 60)}`);
  // biome-ignore lint/suspicious/noControlCharactersInRegex: XML forbids just these.
  if (/[\u0000-\u0008\u000B\u000C\u000E-\u001F]/.test(text)) throw new Error('a control character');
  return text.replace(/&(\w+);/g, (_, name: string) => entities[name] ?? '');
}

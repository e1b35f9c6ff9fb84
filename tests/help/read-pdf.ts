import { extractText, getDocumentProxy } from 'unpdf';

export type ReadPdf = {
  /** The words of each page, spaces of all kinds made one, fractions as "1/2". */
  pages: string[];
  title: string;
  /** Points, width by height, of each page. */
  sizes: [number, number][];
  /** Names of the fonts that came with it. */
  fonts: string[];
};

/** Reads a PDF by another library than the one that wrote it. */
export async function readPdf(bytes: Uint8Array): Promise<ReadPdf> {
  const fonts = [
    ...Buffer.from(bytes)
      .toString('latin1')
      .matchAll(/\/FontName \/(\S+)/g),
  ];
  const pdf = await getDocumentProxy(new Uint8Array(bytes));
  const { text } = await extractText(pdf, { mergePages: false });
  const { info } = await pdf.getMetadata();
  const sizes: [number, number][] = [];
  for (let number = 1; number <= pdf.numPages; number += 1) {
    const [left = 0, bottom = 0, right = 0, top = 0] = (await pdf.getPage(number)).view;
    sizes.push([right - left, top - bottom]);
  }
  return {
    pages: text.map((page) => page.replace(/\s+/g, ' ').replaceAll('\u2044', '/')),
    title: 'Title' in info && typeof info.Title === 'string' ? info.Title : '',
    sizes,
    fonts: fonts.map(([, name = '']) => name),
  };
}

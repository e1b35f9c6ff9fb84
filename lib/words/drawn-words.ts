import type { Drawing, Shape } from '@/lib/drawing/shape';
import type { CrewLanguage } from './crew';
import { featureKinds, featureWord, spanishFeature } from './feature-words';
import { type Region, spanishTradeWord, tradeWord } from './trade';
import { spanishKind } from './unit-names';

/**
 * A drawing in the reader's language: its words are few, and its figures and names stand as they are.
 *
 * Edge: a word that is not known stays English; labels of parts are for links, and stay. Example: "wall A, not read" is "pared A, sin medir".
 */
export function drawingIn(
  drawing: Drawing,
  { language, region }: { language: CrewLanguage; region: Region },
): Drawing {
  if (language === 'en') return drawing;
  const rows = spanishRows(region);
  const inSpanish = (words: string) =>
    rows.reduce((said, [english, spanish]) => said.replace(english, spanish), words);
  const shapeIn = (shape: Shape): Shape => {
    if (shape.kind === 'part') {
      return { ...shape, shapes: shape.shapes.map(shapeIn) };
    }
    if (shape.kind !== 'text') return shape;
    return {
      ...shape,
      spans: shape.spans.map((span) => ({ ...span, words: inSpanish(span.words) })),
    };
  };
  return { ...drawing, shapes: drawing.shapes.map(shapeIn) };
}

function spanishRows(region: Region): [RegExp, string][] {
  const word = (english: string, spanish: string): [RegExp, string] => [
    new RegExp(`(?<![\\p{L}-])${english}(?![\\p{L}-])`, 'u'),
    spanish,
  ];
  const kinds = ['dishwasher', 'range', 'refrigerator', 'hood'] as const;
  return [
    word('stud \\(predicted\\)', 'montante (calculado)'),
    word('stud', 'montante'),
    word('high point', 'punto más alto'),
    word('datum', 'nivel de base'),
    word('not read', 'sin medir'),
    word('true within', 'a escuadra según'),
    word('the reading', 'la medida'),
    word('blank', 'pieza'),
    word('wall', 'pared'),
    word('floor', 'piso'),
    word('open', 'abierta'),
    word('closed', 'cerrada'),
    word(tradeWord('kick', region), spanishTradeWord('kick', region)),
    word(tradeWord('tallUnit', region), spanishKind('tall', region)),
    ...kinds.map((kind) => word(tradeWord(kind, region), spanishKind(kind, region))),
    word('drawers', spanishKind('drawers', region)),
    word('sink', spanishKind('sink', region)),
    word('corner', spanishKind('corner', region)),
    word('end panel', spanishKind('panel', region)),
    ...featureKinds.map((feature) =>
      word(featureWord(feature, region), spanishFeature(feature, region)),
    ),
  ];
}

import type { Layer, Tone } from '@/lib/drawing/shape';

/** A line as a pen draws it; widths and dashes in drawing units. */
export type LayerStyle = {
  fill: string | null;
  stroke: string | null;
  width: number;
  dash: readonly number[];
};

/** The colours of LOOK for white paper: files and prints have no dark set. */
export const inks = {
  sheet: '#FFFFFF',
  paper: '#F6F4EE',
  tint: '#EEEBE2',
  rule: '#D9D4C7',
  ink: '#1B1F23',
  graphite: '#565C61',
  pine: '#1E4B43',
  chalk: '#B1402C',
  ochre: '#8A5A12',
  moss: '#3C6636',
  blueprint: '#2B5785',
} as const;

const line = (stroke: string, width: number, dash: readonly number[] = []): LayerStyle => ({
  fill: null,
  stroke,
  width,
  dash,
});
const area = (fill: string, stroke: string | null = null, width = 1): LayerStyle => ({
  fill,
  stroke,
  width,
  dash: [],
});

/** How each layer is drawn in files and on paper, as it is on the screen. */
export const layerStyle: Record<Layer, LayerStyle> = {
  'wall-body': area(inks.rule),
  'wall-face': line(inks.ink, 2.4),
  'wall-surface': area(inks.paper),
  opening: area(inks.sheet, inks.ink, 1),
  'name-tag': area(inks.sheet, inks.ink, 1.2),
  square: line(inks.chalk, 1.2, [6, 4]),
  unit: area(inks.sheet, inks.ink, 1.5),
  'unit-front': line(inks.graphite, 0.8),
  'unit-upper': line(inks.graphite, 1.1, [7, 4]),
  appliance: area(inks.tint, inks.ink, 1.5),
  filler: area(inks.sheet, inks.chalk, 1),
  'filler-hatch': line(inks.chalk, 0.8),
  counter: area(inks.ink, inks.ink, 1),
  kick: area(inks.tint, inks.graphite, 0.8),
  floor: line(inks.ink, 2.8),
  datum: line(inks.pine, 1.1, [2, 4]),
  'high-point': area(inks.pine),
  'low-point': area(inks.sheet, inks.pine, 1.2),
  stud: line(inks.blueprint, 1.1, [12, 4, 2, 4]),
  'stud-predicted': line(inks.blueprint, 0.8, [5, 4, 1, 4]),
  feature: line(inks.blueprint, 1.2),
  diagonal: line(inks.graphite, 0.8, [10, 5]),
  dimension: line(inks.graphite, 0.9),
  'diagonal-asked': line(inks.blueprint, 2, [9, 4, 2, 4]),
  'walk-as-read': line(inks.graphite, 1.4, [5, 3]),
  'walk-gap': area(inks.chalk, inks.chalk, 3),
  'error-ellipse': line(inks.pine, 1.4),
  'held-corner': area(inks.pine),
  'suspect-line': line(inks.chalk, 5),
  'suspect-ring': area(inks.sheet, inks.chalk, 2),
  suspect: line(inks.chalk, 2.4),
  'revision-cloud': line(inks.chalk, 1.4),
  'revision-letter': area(inks.sheet, inks.chalk, 1.4),
  'revision-struck': line(inks.graphite, 1.4),
  collision: line(inks.chalk, 2, [4, 3]),
};

export type ToneStyle = { colour: string; weight: 400 | 500 | 600 };

export const toneStyle: Record<Tone, ToneStyle> = {
  plain: { colour: inks.ink, weight: 400 },
  strong: { colour: inks.ink, weight: 600 },
  quiet: { colour: inks.graphite, weight: 400 },
  over: { colour: inks.chalk, weight: 600 },
  close: { colour: inks.ochre, weight: 500 },
  within: { colour: inks.moss, weight: 500 },
  site: { colour: inks.blueprint, weight: 500 },
};

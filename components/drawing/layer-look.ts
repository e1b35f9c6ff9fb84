import type { Layer, Tone } from '@/lib/drawing/shape';

/** How each layer is drawn: weight by what it is, colour by what it means, as on a site drawing. */
export const layerLook: Record<Layer, string> = {
  'wall-body': 'fill-rule stroke-none',
  'wall-face': 'fill-none stroke-ink [stroke-width:2.4]',
  'wall-surface': 'fill-paper stroke-none',
  opening: 'fill-sheet stroke-ink [stroke-width:1]',
  'name-tag': 'fill-sheet stroke-ink [stroke-width:1.2]',
  square: 'fill-none stroke-chalk [stroke-width:1.2] [stroke-dasharray:6_4]',
  unit: 'fill-sheet stroke-ink [stroke-width:1.5]',
  'unit-front': 'fill-none stroke-graphite [stroke-width:0.8]',
  'unit-upper': 'fill-none stroke-graphite [stroke-width:1.1] [stroke-dasharray:7_4]',
  appliance: 'fill-tint stroke-ink [stroke-width:1.5]',
  filler: 'fill-sheet stroke-chalk [stroke-width:1]',
  'filler-hatch': 'fill-none stroke-chalk [stroke-width:0.8]',
  counter: 'fill-ink stroke-ink [stroke-width:1]',
  kick: 'fill-tint stroke-graphite [stroke-width:0.8]',
  floor: 'fill-none stroke-ink [stroke-width:2.8]',
  datum: 'fill-none stroke-pine [stroke-width:1.1] [stroke-dasharray:2_4]',
  'high-point': 'fill-pine stroke-none',
  'low-point': 'fill-sheet stroke-pine [stroke-width:1.2]',
  stud: 'fill-none stroke-blueprint [stroke-width:1.1] [stroke-dasharray:12_4_2_4]',
  'stud-predicted':
    'fill-none stroke-blueprint [stroke-width:0.8] [stroke-dasharray:5_4_1_4] [stroke-opacity:0.75]',
  feature: 'fill-none stroke-blueprint [stroke-width:1.2]',
  diagonal: 'fill-none stroke-graphite [stroke-width:0.8] [stroke-dasharray:10_5]',
  dimension: 'fill-none stroke-graphite [stroke-width:0.9]',
  'diagonal-asked': 'fill-none stroke-blueprint [stroke-width:2] [stroke-dasharray:9_4_2_4]',
  'walk-as-read': 'fill-none stroke-graphite [stroke-width:1.4] [stroke-dasharray:5_3]',
  'walk-gap': 'fill-chalk stroke-chalk [stroke-width:3]',
  'error-ellipse': 'fill-none stroke-pine [stroke-width:1.4]',
  'held-corner': 'fill-pine stroke-none',
  'suspect-line': 'fill-none stroke-chalk [stroke-width:5]',
  'suspect-ring': 'fill-sheet stroke-chalk [stroke-width:2]',
  suspect: 'fill-none stroke-chalk [stroke-width:2.4]',
  collision: 'fill-none stroke-chalk [stroke-width:2] [stroke-dasharray:4_3]',
};

export const toneLook: Record<Tone, string> = {
  plain: 'fill-ink',
  strong: 'fill-ink font-bold',
  quiet: 'fill-graphite',
  over: 'fill-chalk font-bold',
  close: 'fill-ochre font-medium',
  within: 'fill-moss font-medium',
  site: 'fill-blueprint font-medium',
};

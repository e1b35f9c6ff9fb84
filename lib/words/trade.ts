/**
 * Things of the trade as the shop's region calls them: the one place where such a word is written.
 * The rows and the V numbers are those of the glossary that the shop's practice was read into; rows marked
 * "seen" have Spanish that was read in a source, the others are recalled and want a native-speaking crew.
 */
import type { FitRules } from '@/lib/contracts/shop-rules';

export type Region = FitRules['region'];
/** `esUs`: as Spanish-speaking crews in the US say it, where that is another word. */
type Row = { us: string; uk: string; au?: string; es: string; esUs?: string };

/** In the middle of a sentence; EU shops write English as in the UK. */
const rows = {
  /** V42, seen. */
  counter: { us: 'countertop', uk: 'worktop', au: 'benchtop', es: 'encimera', esUs: 'cubierta' },
  /** V43. */
  splash: { us: 'backsplash', uk: 'splashback', es: 'salpicadero' },
  /** V35, seen. */
  kick: { us: 'toe kick', uk: 'plinth', au: 'kickboard', es: 'zócalo', esUs: 'zoclo' },
  /** V36. */
  kickBase: { us: 'toe-kick platform', uk: 'plinth frame', au: 'ladder frame', es: 'base' },
  /** V25, seen. */
  filler: { us: 'filler', uk: 'infill', es: 'relleno' },
  /** V31. */
  crown: { us: 'crown molding', uk: 'cornice', es: 'moldura de corona' },
  /** V40. */
  skirting: { us: 'baseboard', uk: 'skirting board', es: 'rodapié', esUs: 'zoclo' },
  /** V41. */
  casing: { us: 'casing', uk: 'architrave', es: 'marco' },
  /** V51. */
  board: { us: 'drywall', uk: 'plasterboard', es: 'panel de yeso', esUs: 'tablaroca' },
  /** V52, seen. */
  plaster: { us: 'plaster', uk: 'plaster', es: 'yeso' },
  /** V50. */
  backing: { us: 'backing', uk: 'noggins', es: 'refuerzo' },
  /** V38, seen. */
  shim: { us: 'shim', uk: 'packer', es: 'cuña' },
  /** V76, seen. */
  outlet: { us: 'outlet', uk: 'socket', au: 'power point', es: 'tomacorriente', esUs: 'contacto' },
  /** V76, seen. */
  switch: { us: 'switch', uk: 'switch', es: 'interruptor' },
  /** V78, seen. */
  drain: { us: 'drain', uk: 'waste', es: 'desagüe' },
  /** V06, seen. */
  baseUnit: { us: 'base cabinet', uk: 'base unit', es: 'gabinete bajo' },
  /** V07, seen. */
  wallUnit: { us: 'wall cabinet', uk: 'wall unit', es: 'gabinete alto' },
  /** V08, seen. */
  tallUnit: { us: 'tall cabinet', uk: 'tall unit', es: 'despensero' },
  /** V74. */
  range: { us: 'range', uk: 'cooker', es: 'estufa' },
  /** V74. */
  cooktop: { us: 'cooktop', uk: 'hob', au: 'cooktop', es: 'placa', esUs: 'parrilla' },
  /** Recalled, in no row. */
  tap: { us: 'faucet', uk: 'tap', es: 'llave' },
  /** V74. */
  hood: { us: 'hood', uk: 'extractor', es: 'campana' },
  /** V24. */
  refrigerator: { us: 'refrigerator', uk: 'fridge', es: 'refrigerador' },
  /** V75. */
  dishwasher: { us: 'dishwasher', uk: 'dishwasher', es: 'lavavajillas' },
} as const satisfies Record<string, Row>;

export type TradeTerm = keyof typeof rows;
export const tradeTerms = Object.keys(rows) as TradeTerm[];

/**
 * A thing of the trade as it is called where the shop is, in the middle of a sentence.
 *
 * Edge: where Australia has no word of its own it says what the UK says; so does the EU.
 * Example: 'kick' is "toe kick" in the US, "plinth" in the UK, "kickboard" in Australia.
 * Source: glossary V01–V90 of the practice notes, by row above.
 */
export function tradeWord(term: TradeTerm, region: Region): string {
  const row: Row = rows[term];
  if (region === 'US') return row.us;
  return region === 'AU' ? (row.au ?? row.uk) : row.uk;
}

/** The same at the beginning of a line: "Toe kick". */
export function tradeName(term: TradeTerm, region: Region): string {
  const word = tradeWord(term, region);
  return word.charAt(0).toUpperCase() + word.slice(1);
}

/** For customers and crews who read Spanish: "cubierta" in the US, "encimera" elsewhere. */
export function spanishTradeWord(term: TradeTerm, region: Region): string {
  const row: Row = rows[term];
  return region === 'US' ? (row.esUs ?? row.es) : row.es;
}

import type { FeatureKind } from '@/lib/contracts/readings';
import { type Region, spanishTradeWord, tradeWord } from './trade';

/** What is on a wall, in the middle of a sentence: "outlet" in the US is "socket" in the UK. */
export function featureWord(feature: FeatureKind, region: Region = 'US'): string {
  switch (feature) {
    case 'outlet':
    case 'switch':
      return tradeWord(feature, region);
    case 'waste':
      return tradeWord('drain', region);
    case 'panel':
      return 'service panel';
    default:
      return feature;
  }
}

/** The same at the beginning of a line. */
export function featureName(feature: FeatureKind, region: Region = 'US'): string {
  const word = featureWord(feature, region);
  return word.charAt(0).toUpperCase() + word.slice(1);
}

const spanish: Record<FeatureKind, string> = {
  window: 'ventana',
  door: 'puerta',
  opening: 'vano',
  outlet: 'tomacorriente',
  switch: 'interruptor',
  water: 'agua',
  waste: 'desagüe',
  gas: 'gas',
  vent: 'ventilación',
  radiator: 'radiador',
  panel: 'tablero',
  beam: 'viga',
  pipe: 'tubo',
  other: 'otro',
};

/** The same in Spanish: recalled, but for the words of the glossary. Example: "outlet" is "contacto" in the US. */
export function spanishFeature(feature: FeatureKind, region: Region): string {
  if (feature === 'outlet' || feature === 'switch') return spanishTradeWord(feature, region);
  return feature === 'waste' ? spanishTradeWord('drain', region) : spanish[feature];
}

export const featureKinds = Object.keys(spanish) as FeatureKind[];

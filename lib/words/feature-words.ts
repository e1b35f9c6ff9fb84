import type { FeatureKind } from '@/lib/contracts/readings';
import { type Region, tradeWord } from './trade';

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

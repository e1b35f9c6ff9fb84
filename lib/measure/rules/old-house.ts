import type { Region } from './default-rules';

/** Lead paint in the US before 1978 (40 CFR 745); asbestos in the UK before 2000, and alike elsewhere. */
const oldBefore: Record<Region, number> = { US: 1978, UK: 2000, AU: 2000, EU: 2000 };

/**
 * Whether a house may hold what must not be cut, sanded or scraped without the local law's precautions.
 *
 * Edge: a house whose year nobody knows counts as old.
 * Example: a house of 1977 in the US is old, one of 1978 is not.
 * Source: 40 CFR 745.83 (US, 1978); HSE (UK, 2000); elsewhere by analogy, common practice.
 */
export function isOldHouse(yearBuilt: number | null, region: Region): boolean {
  return yearBuilt === null || yearBuilt < oldBefore[region];
}

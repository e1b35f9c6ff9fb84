import type { Reading } from '@/lib/contracts/readings';
import type { Run } from '@/lib/contracts/runs';
import { standingReadings } from '@/lib/measure/standing-readings';

type CautionSource = { runs: readonly Run[]; readings: readonly Reading[]; isOldHouse: boolean };

const services = new Set<string>([
  'outlet',
  'switch',
  'water',
  'waste',
  'gas',
  'vent',
  'panel',
  'pipe',
]);

/**
 * The trade's cautions that belong on this sheet, the general one last.
 *
 * Edge: gas is named only where gas was read; without a hung box nothing is said of studs.
 * Example: a room with tall units and a house of unknown year gets the lift, the old house and the rest.
 * Source: common practice; the local law and the makers' instructions come before all of it.
 */
export function cautionsFor({ runs, readings, isOldHouse }: CautionSource): string[] {
  const features = standingReadings(readings).flatMap((reading) =>
    reading.kind === 'feature' ? [reading.feature as string] : [],
  );
  const hasTall = runs.some(({ level }) => level === 'tall');
  const hasHung = runs.some(({ level }) => level === 'wall');
  return [
    ...(hasHung ? ['Wall units go to studs or backing, never to board alone.'] : []),
    ...(hasTall
      ? ['Tall units: two people lift, and they are secured before the doors go on.']
      : ['Two people lift what is over the shop’s limit.']),
    'Find cables and pipes before drilling.',
    ...(features.some((feature) => services.has(feature))
      ? [
          `Power${features.includes('gas') ? ', water and gas are' : ' and water are'} made safe and disconnected by the licensed trade.`,
        ]
      : []),
    ...(isOldHouse
      ? [
          'This house may hold lead paint or asbestos: follow the local law before you cut, sand or scrape.',
        ]
      : []),
    'Eyes, ears and lungs protected when cutting and scribing.',
    'Local codes and the maker’s instructions come first.',
  ];
}

import type { Run, Unit, UnitKind } from '@/lib/contracts/runs';

const inch = 25.4;

/** What the shop would build in the crooked kitchen: sink wall with uppers, tall wall opposite. */
export function kitchenRuns(wallIds: string[], newId: () => string): Run[] {
  const unit = (kind: UnitKind, inches: number, name = '', alterable = false): Unit => ({
    id: newId(),
    name,
    kind,
    widthMm: inches * inch,
    alterable: alterable
      ? { minMm: (inches - 6) * inch, maxMm: (inches + 6) * inch, stepMm: 3 * inch }
      : null,
  });
  const base = { level: 'base' as const, carcassDepthMm: 584.2, bumperMm: 2, doorMm: 19 };
  const upper = {
    level: 'wall' as const,
    carcassDepthMm: 304.8,
    bumperMm: 2,
    doorMm: 19,
    z0Mm: 54 * inch,
    z1Mm: 84 * inch,
    share: { how: 'equal' as const },
    counterGroup: null,
  };
  const [wallA = '', , wallC = ''] = wallIds;
  return [
    {
      ...base,
      id: newId(),
      wallId: wallA,
      name: 'Sink wall',
      left: { kind: 'wall' },
      right: { kind: 'wall' },
      z0Mm: 4 * inch,
      z1Mm: 34.5 * inch,
      units: [
        unit('drawers', 21, '', true),
        unit('sink', 36, '', true),
        { ...unit('dishwasher', 24), needHeightMm: 34 * inch },
        unit('base', 30, '', true),
        unit('base', 27, '', true),
      ],
      share: { how: 'equal' },
      counterGroup: 'sink',
    },
    {
      ...upper,
      id: newId(),
      wallId: wallA,
      name: 'Uppers left',
      left: { kind: 'wall' },
      right: { kind: 'casing', xMm: 48 * inch },
      units: [unit('wall', 18), unit('wall', 24)],
    },
    {
      ...upper,
      id: newId(),
      wallId: wallA,
      name: 'Uppers right',
      left: { kind: 'casing', xMm: 94 * inch },
      right: { kind: 'wall' },
      units: [unit('wall', 24), unit('wall', 18)],
    },
    {
      ...base,
      id: newId(),
      wallId: wallC,
      name: 'Tall wall',
      level: 'tall',
      left: { kind: 'open', limitMm: 20 * inch },
      right: { kind: 'wall' },
      z0Mm: 4 * inch,
      z1Mm: 90 * inch,
      units: [unit('panel', 0.75), unit('tall', 24, 'Pantry'), unit('refrigerator', 36)],
      share: { how: 'equal' },
      counterGroup: null,
    },
  ];
}

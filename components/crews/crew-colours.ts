import type { CrewView } from '@/lib/contracts/visits';

/** The crew colours of the look, by what people call them. */
export const crewColours: { value: CrewView['colour']; label: string }[] = [
  { value: '1', label: 'pine' },
  { value: '2', label: 'ochre' },
  { value: '3', label: 'blueprint' },
  { value: '4', label: 'plum' },
  { value: '5', label: 'olive' },
  { value: '6', label: 'brick' },
];

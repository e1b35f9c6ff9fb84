import type { CrewView } from '@/lib/contracts/visits';

/** The crew's colour as the look names it, for inline styles of calendar events and swatches. */
export const crewColour = (colour: CrewView['colour']): string => `var(--crew${colour})`;

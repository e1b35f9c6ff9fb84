/** Where an address is: what the business asks of an address service. Rooms ask `findAddress` (server/shops). */
import type { FoundPlace } from '@/lib/contracts/travel';

export type GeocodeQuestion = {
  /** As a person writes it: "14 Quay Rise, Quayside 02101". */
  text: string;
  /** ISO 3166-1, two letters, to look in one country alone. */
  country: string | null;
};

export type GeocodeAnswer =
  /** The best first; none when the service knows no such address. */
  | { ok: true; places: FoundPlace[] }
  | { ok: false; reason: 'unreachable' | 'no-answer' | 'busy' | 'refused' };

export type GeocodePort = { find(question: GeocodeQuestion): Promise<GeocodeAnswer> };

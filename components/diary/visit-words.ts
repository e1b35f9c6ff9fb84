import type { VerdictKind } from '@/components/ui/verdict';
import type { VisitStatus } from '@/lib/contracts/visits';

/** How a visit stands, in the words of the diary and with the glyph that goes with them. */
export const statusWords: Record<VisitStatus, { words: string; verdict: VerdictKind }> = {
  held: { words: 'held for the customer', verdict: 'waiting' },
  booked: { words: 'no answer yet', verdict: 'waiting' },
  confirmed: { words: 'said yes', verdict: 'confirmed' },
  'on-the-way': { words: 'on the way', verdict: 'confirmed' },
  'on-site': { words: 'on site', verdict: 'confirmed' },
  done: { words: 'done', verdict: 'confirmed' },
  missed: { words: 'nobody home', verdict: 'late' },
  'called-off': { words: 'called off', verdict: 'off' },
};

/** "1 h 30", "45 min", "2 days of 8 h" is for people; minutes are for the program. */
export function minutesWords(minutes: number): string {
  if (minutes < 60) return `${minutes} min`;
  const hours = Math.floor(minutes / 60);
  const rest = minutes % 60;
  return rest === 0 ? `${hours} h` : `${hours} h ${rest}`;
}

/** Hours of a day as a person types them: "7:30-16", "8am-4:30pm"; nothing is a day off. */
import type { WorkedHours } from '@/lib/schedule/working-pattern';

export type HoursRead = { hours: WorkedHours | null; error: string | null };

const clock = /^(\d{1,2})(?:[:.]?(\d\d))?\s*(am|pm)?$/i;
const ask = 'Write the hours as 7:30-16:00, or leave it empty for a day off.';

/** Example: " 7.30 – 16 " is 07:30 to 16:00; "8am-4pm" is 08:00 to 16:00; "" is a day off. */
export function readHours(text: string): HoursRead {
  const plain = text.trim();
  if (plain === '' || plain === '-' || /^off$/i.test(plain)) return { hours: null, error: null };
  const [first = '', second = '', ...more] = plain.split(/\s*(?:-|–|—|\bto\b)\s*/i);
  const start = readTime(first);
  const end = readTime(second);
  if (!start || !end || more.length > 0) return { hours: null, error: ask };
  if (start >= end) return { hours: null, error: 'The day ends before it starts.' };
  return { hours: { start, end }, error: null };
}

export function hoursText(hours: WorkedHours | null | undefined): string {
  return hours ? `${hours.start}-${hours.end}` : '';
}

function readTime(text: string): string | null {
  const [, hourText, minuteText = '00', half] = clock.exec(text.trim()) ?? [];
  if (!hourText) return null;
  const typed = Number(hourText);
  if (half && (typed < 1 || typed > 12)) return null;
  const hour = half ? (typed % 12) + (half.toLowerCase() === 'pm' ? 12 : 0) : typed;
  const minute = Number(minuteText);
  if (hour > 23 || minute > 59) return null;
  return `${String(hour).padStart(2, '0')}:${String(minute).padStart(2, '0')}`;
}

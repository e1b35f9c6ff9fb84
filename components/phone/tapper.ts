import type { Tapper } from '@/lib/days/stop-on-phone';

/** Who taps on this phone, and the time as the phone's clock shows it. */
export function tapperOf(personName: string): Tapper {
  return {
    personName,
    momentWords: (at) =>
      new Date(at).toLocaleString(undefined, {
        weekday: 'short',
        hour: '2-digit',
        minute: '2-digit',
      }),
  };
}

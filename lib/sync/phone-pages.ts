/** The pages that a phone opens without a signal: `/today`, `/walls` and what lies below them. */
export function isPhonePage(pathname: string): boolean {
  return /^\/(?:today|walls)(?:\/|$)/.test(pathname);
}

export type PhonePlace =
  | { page: 'today'; date: string | null }
  | { page: 'visit'; visitId: string }
  | { page: 'walls'; roomId: string; jobId: string | null }
  | { page: 'unknown' };

/**
 * Which page an address asks for, so that it can be shown from what the phone keeps.
 * Example: `/walls/1b4e…` with `?job=77c2…` is the wall book of a room of that job.
 */
export function phonePlaceOf(pathname: string, search: string): PhonePlace {
  const [first, id, ...more] = pathname.split('/').filter(Boolean).map(decoded);
  const query = new URLSearchParams(search);
  if (more.length > 0) return { page: 'unknown' };
  if (first === 'today' && id) return { page: 'visit', visitId: id };
  if (first === 'today') return { page: 'today', date: query.get('on') };
  if (first === 'walls' && id) return { page: 'walls', roomId: id, jobId: query.get('job') };
  return { page: 'unknown' };
}

function decoded(part: string): string {
  try {
    return decodeURIComponent(part);
  } catch {
    return part;
  }
}

import { type Answer, isPassing, refusalWords, type Settled } from './settle-batch';

export type SettledPhoto = {
  isTaken: boolean;
  /** Why the office will not take it as it is. */
  parked: string | null;
  next: Settled['next'];
};

/**
 * What an answer means for a photo, by the same rules as for readings: only an answer that names the photo
 * lets it go, whatever is in doubt stays.
 * Example: 201 from a hotel's sign-in page has no JSON: the photo waits.
 */
export function settlePhoto(fileId: string, answer: Answer): SettledPhoto {
  const waits: SettledPhoto = { isTaken: false, parked: null, next: 'wait' };
  if (answer === 'no-answer') return waits;
  const { status, json } = answer;
  if (status === 401) return { ...waits, next: 'sign-in' };
  if (status >= 200 && status < 300) {
    const isNamed =
      typeof json === 'object' && json !== null && 'fileId' in json && json.fileId === fileId;
    return isNamed ? { isTaken: true, parked: null, next: 'go-on' } : waits;
  }
  if (status < 400 || status >= 500 || isPassing(status)) return waits;
  return { isTaken: false, parked: refusalWords(json, status), next: 'go-on' };
}

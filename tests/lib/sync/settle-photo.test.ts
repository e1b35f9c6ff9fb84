import { describe, expect, it } from 'vitest';
import type { Answer } from '@/lib/sync/settle-batch';
import { settlePhoto } from '@/lib/sync/settle-photo';

const waits = { isTaken: false, parked: null, next: 'wait' };

describe('a photo that was sent', () => {
  it('is taken when the office names it', () => {
    expect(settlePhoto('p1', { status: 200, json: { fileId: 'p1' } })).toEqual({
      isTaken: true,
      parked: null,
      next: 'go-on',
    });
  });

  it.each<[string, Answer]>([
    ['no answer', 'no-answer'],
    ['a hotel’s sign-in page', { status: 200, json: null }],
    ['another photo’s name', { status: 200, json: { fileId: 'p2' } }],
    ['a server that is down', { status: 503, json: null }],
    ['a redirect', { status: 302, json: null }],
    ['too many at once', { status: 429, json: { title: 'Too many', status: 429 } }],
  ])('waits after %s', (_what, answer) => {
    expect(settlePhoto('p1', answer)).toEqual(waits);
  });

  it('waits for a sign-in', () => {
    expect(settlePhoto('p1', { status: 401, json: null })).toEqual({ ...waits, next: 'sign-in' });
  });

  it('stays here with the office’s words when it is refused', () => {
    const json = { title: 'This photo is damaged', status: 422, detail: 'Take it again.' };
    expect(settlePhoto('p1', { status: 422, json })).toEqual({
      isTaken: false,
      parked: 'Take it again.',
      next: 'go-on',
    });
    expect(settlePhoto('p1', { status: 413, json: null }).parked).toBe(
      'The office refused it (413).',
    );
  });
});

import { describe, expect, it } from 'vitest';
import { readProblemDetails } from '@/lib/problem-details';

describe('readProblemDetails', () => {
  it('reads a problem with the errors of its fields', () => {
    const body = {
      type: 'invalid-input',
      title: 'Not saved',
      status: 422,
      detail: 'Two fields need another look.',
      errors: { email: 'An e-mail address has an @ in it.' },
    };
    expect(readProblemDetails(body)).toEqual(body);
  });

  it('names an unnamed type as RFC 9457, 4.2.1 says', () => {
    expect(readProblemDetails({ title: 'Not found', status: 404 })?.type).toBe('about:blank');
  });

  it('says once what title and detail say alike, and keeps what is needed to go on', () => {
    const problem = {
      type: 'urn:x',
      title: 'Moved',
      status: 409,
      code: 'stale',
      current: { v: 2 },
    };
    expect(readProblemDetails({ ...problem, detail: 'Moved' })).toEqual(problem);
  });

  it('leaves out errors that are not texts', () => {
    const problem = readProblemDetails({ title: 'Not saved', status: 422, errors: { email: 3 } });
    expect(problem).toEqual({ type: 'about:blank', title: 'Not saved', status: 422 });
  });

  it.each([null, 'Bad gateway', 502, [], {}, { title: 'x' }])('reads no problem in %j', (body) => {
    expect(readProblemDetails(body)).toBeNull();
  });
});

/** Refusals that the outside may read: RFC 9457 problem details. Anything else is a bug and says little. */

export type RefusalDetail = {
  status: 400 | 401 | 403 | 404 | 409 | 410 | 413 | 415 | 422 | 429 | 503;
  /** Stable, kebab-case. */
  code: string;
  /** What happened, what was kept, what to do. */
  message: string;
  /** Per field of the form: path → words. */
  errors?: Record<string, string>;
  /** What the caller needs to go on, such as the current visit. */
  current?: unknown;
};

export class Refusal extends Error {
  constructor(readonly refusal: RefusalDetail) {
    super(refusal.message);
    this.name = 'Refusal';
  }
}

export function notFound(what: string): Refusal {
  return new Refusal({
    status: 404,
    code: 'not-found',
    message: `There is no such ${what} in this shop.`,
  });
}

export function refused(): Refusal {
  return new Refusal({
    status: 403,
    code: 'not-your-role',
    message: 'Your role in this shop does not include this. The owner can change roles.',
  });
}

export function refusedToKey(permission: string): Refusal {
  return new Refusal({
    status: 403,
    code: 'not-in-scope',
    message: `This key was not given ${permission}. Its owner can make another under Other programs.`,
  });
}

export function problemResponse(refusal: RefusalDetail): Response {
  const { status, code, message, errors, current } = refusal;
  const [title, detail] = firstSentence(message);
  return Response.json(
    { type: `urn:setwell:problem:${code}`, title, status, code, detail, errors, current },
    {
      status,
      headers: { 'content-type': 'application/problem+json', 'cache-control': 'no-store' },
    },
  );
}

/** What happened is the title; what was kept and what to do is the detail. */
function firstSentence(message: string): [string, string | undefined] {
  const end = message.search(/\.\s/);
  return end < 0 ? [message, undefined] : [message.slice(0, end), message.slice(end + 2)];
}

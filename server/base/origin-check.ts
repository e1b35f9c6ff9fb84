import { env } from './env';
import { Refusal } from './problem-response';

/** A write must come from our own pages: browsers say where from, and a stranger's page cannot lie. */
export function checkOrigin(request: Request): void {
  if (request.method === 'GET' || request.method === 'HEAD') return;
  const origin = request.headers.get('origin');
  if (!origin) {
    if (request.headers.get('sec-fetch-site') === 'cross-site') throw stranger();
    return;
  }
  // A page that sends no referrer says "null"; then the browser's own word on the site decides.
  if (origin === 'null' && request.headers.get('sec-fetch-site') === 'same-origin') return;
  const host = request.headers.get('host');
  const ours = origin === env().publicUrl || (host !== null && hostOf(origin) === host);
  if (!ours) throw stranger();
}

function hostOf(origin: string): string | null {
  return URL.canParse(origin) ? new URL(origin).host : null;
}

function stranger(): Refusal {
  return new Refusal({
    status: 403,
    code: 'foreign-origin',
    message: 'This request came from another site and was not carried out.',
  });
}

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
  const host = request.headers.get('host');
  const ours = origin === env().publicUrl || (host !== null && new URL(origin).host === host);
  if (!ours) throw stranger();
}

function stranger(): Refusal {
  return new Refusal({
    status: 403,
    code: 'foreign-origin',
    message: 'This request came from another site and was not carried out.',
  });
}

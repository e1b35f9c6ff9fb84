/** How the server says that something went wrong: RFC 9457 problem details, with one text per field. */
export type ProblemDetails = {
  type: string;
  /** What happened, in a few words. */
  title: string;
  status: number;
  /** What happened, what was kept, what to do. */
  detail?: string;
  /** Stable, kebab-case, to act on: "crew-already-booked". */
  code?: string;
  /** By the path of the field: "email", "units.3.widthMm". */
  errors?: Record<string, string>;
  /** What the caller needs to go on, such as the visit as it is now. */
  current?: unknown;
};

/**
 * Reads a body as problem details; null for anything else (a proxy's page, an empty answer).
 * Example: `readProblemDetails({ title: 'Not found', status: 404 })` has type "about:blank" (RFC 9457, 4.2.1).
 */
export function readProblemDetails(body: unknown): ProblemDetails | null {
  if (typeof body !== 'object' || body === null) return null;
  const { type, title, status, detail, code, errors, current } = body as Record<string, unknown>;
  if (typeof title !== 'string' || typeof status !== 'number') return null;
  return {
    type: typeof type === 'string' ? type : 'about:blank',
    title,
    status,
    ...(typeof detail === 'string' && detail !== title ? { detail } : {}),
    ...(typeof code === 'string' ? { code } : {}),
    ...(isTextRecord(errors) ? { errors } : {}),
    ...(typeof code === 'string' ? { code } : {}),
    ...(current === undefined ? {} : { current }),
    ...(current === undefined ? {} : { current }),
  };
}

function isTextRecord(value: unknown): value is Record<string, string> {
  return (
    typeof value === 'object' &&
    value !== null &&
    Object.values(value).every((text) => typeof text === 'string')
  );
}

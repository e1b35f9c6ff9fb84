import type { z } from 'zod';
import { Refusal } from './problem-response';

/** Enough for a day's readings from one phone. */
const mostBytes = 2_000_000;

/** One object from the address, the query and the body; the address wins, so that a body cannot redirect it. */
export async function readInput<S extends z.ZodType>(
  schema: S,
  request: Request,
  params: Record<string, string>,
): Promise<z.output<S>> {
  const query = Object.fromEntries(new URL(request.url).searchParams);
  const body = request.method === 'GET' ? {} : await readBody(request);
  return understood(schema, { ...query, ...body, ...params });
}

/** What a schema makes of it; a refusal names each field that is not as it should be. */
export function understood<S extends z.ZodType>(schema: S, value: unknown): z.output<S> {
  const parsed = schema.safeParse(value);
  if (parsed.success) return parsed.data;
  const errors: Record<string, string> = {};
  for (const issue of parsed.error.issues) errors[issue.path.join('.')] ??= issueWords(issue);
  throw new Refusal({
    status: 422,
    code: 'not-understood',
    message: 'Something in what was sent is not as it should be. Nothing was changed.',
    errors,
  });
}

/** What a contract has no words for is said by the library in its own; of these a missing field and a number that is none are the usual ones. */
function issueWords(issue: z.core.$ZodIssue): string {
  if (issue.code !== 'invalid_type' || !issue.message.startsWith('Invalid input')) {
    return issue.message;
  }
  if (issue.message.endsWith('received undefined')) return 'Is missing.';
  return issue.expected === 'number' ? 'Write a number.' : issue.message;
}

async function readBody(request: Request): Promise<Record<string, unknown>> {
  const text = await request.text();
  if (text.length > mostBytes) {
    throw new Refusal({
      status: 400,
      code: 'too-large',
      message: 'That is too much to send at once.',
    });
  }
  if (text === '') return {};
  if (request.headers.get('content-type')?.includes('application/x-www-form-urlencoded')) {
    return Object.fromEntries(new URLSearchParams(text));
  }
  try {
    const value: unknown = JSON.parse(text);
    if (value && typeof value === 'object' && !Array.isArray(value)) {
      return value as Record<string, unknown>;
    }
  } catch {
    // Falls through to the same refusal as a body that is no object.
  }
  throw new Refusal({ status: 400, code: 'not-json', message: 'The body must be a JSON object.' });
}

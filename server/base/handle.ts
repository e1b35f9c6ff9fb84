import type { z } from 'zod';
import type { PersonContext } from './context';
import { bearerKey, keyContext } from './key-context';
import { logBug } from './log';
import { checkOrigin } from './origin-check';
import { personContext } from './person-context';
import { problemResponse, Refusal } from './problem-response';
import { readInput } from './read-input';

type Params = { params: Promise<Record<string, string>> };
export type RouteHandler = (request: Request, route?: Params) => Promise<Response>;

/** A route for a signed-in person: origin → session → context → parse → verb → answer. */
export function handle<S extends z.ZodType, O>(
  input: S,
  verb: (ctx: PersonContext, input: z.output<S>) => Promise<O>,
): RouteHandler {
  return answering(async (request, params) => {
    const ctx = await signedIn(request);
    return json(await verb(ctx, await readInput(input, request, params)));
  });
}

/** Who asks; a request that nobody is signed in for goes no further. */
export async function signedIn(request: Request): Promise<PersonContext> {
  const key = bearerKey(request.headers);
  const ctx = key === null ? await personContext(request.headers) : await keyContext(key);
  if (ctx) return ctx;
  if (key !== null) {
    throw new Refusal({
      status: 401,
      code: 'no-such-key',
      message:
        'This key opens nothing: it was never made, or was taken back. Ask the shop’s owner.',
    });
  }
  throw new Refusal({
    status: 401,
    code: 'not-signed-in',
    message: 'Sign in again. What you entered is kept.',
  });
}

/** A route that anyone may call: sign-up, joining, health. */
export function handleOpen<S extends z.ZodType>(
  input: S,
  verb: (input: z.output<S>, request: Request) => Promise<unknown>,
): RouteHandler {
  return answering(async (request, params) => {
    const answer = await verb(await readInput(input, request, params), request);
    return answer instanceof Response ? answer : json(answer);
  });
}

/** The one place where problems become HTTP; what is not a refusal is a bug, and says little outside. */
export function answering(
  work: (request: Request, params: Record<string, string>) => Promise<Response>,
): RouteHandler {
  return async (request, route) => {
    try {
      checkOrigin(request);
      return await work(request, (await route?.params) ?? {});
    } catch (error) {
      if (error instanceof Refusal) return problemResponse(error.refusal);
      logBug(`${request.method} ${new URL(request.url).pathname}`, error);
      return Response.json(
        {
          type: 'urn:setwell:problem:bug',
          title: 'Something went wrong',
          status: 500,
          detail:
            'Something went wrong on our side. What you entered is kept on this screen; try again.',
        },
        { status: 500, headers: { 'content-type': 'application/problem+json' } },
      );
    }
  };
}

export function json(value: unknown): Response {
  return Response.json(value ?? null, { headers: { 'cache-control': 'no-store' } });
}

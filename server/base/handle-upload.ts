import type { z } from 'zod';
import type { PersonContext } from './context';
import { answering, json, type RouteHandler, signedIn } from './handle';
import { readBytes } from './read-bytes';
import { understood } from './read-input';

/**
 * A route that takes one file as its body; what is said of it stands in the address. Nobody's bytes are
 * read before the origin, the session and the address are known to be good.
 */
export function handleUpload<S extends z.ZodType<object>, O>(
  { input, mostBytes }: { input: S; mostBytes: number },
  verb: (ctx: PersonContext, input: z.output<S> & { bytes: Uint8Array }) => Promise<O>,
): RouteHandler {
  return answering(async (request, params) => {
    const ctx = await signedIn(request);
    const query = Object.fromEntries(new URL(request.url).searchParams);
    const said = understood(input, { ...query, ...params });
    const bytes = await readBytes(request, mostBytes);
    return json(await verb(ctx, { ...said, bytes }));
  });
}

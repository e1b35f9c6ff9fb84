import type { z } from 'zod';
import { contentDisposition } from './content-disposition';
import type { PersonContext } from './context';
import { answering, type RouteHandler, signedIn } from './handle';
import { readInput } from './read-input';

export type FileAnswer = {
  /** Opens the bytes; not called when the browser has them already. */
  open: () => Promise<ReadableStream<Uint8Array>>;
  mediaType: string;
  bytes: number;
  name: string;
  /** Changes when the bytes do. */
  mark: string;
  /** Saved under its name; shown where it is not said. */
  isSaved?: boolean;
};

/**
 * A route that answers with a file. The browser asks again each time it shows it, so that nothing is shown
 * after a sign-out; what has not changed is not sent again.
 */
export function handleFile<S extends z.ZodType>(
  input: S,
  verb: (ctx: PersonContext, input: z.output<S>) => Promise<FileAnswer>,
): RouteHandler {
  return answering(async (request, params) => {
    const ctx = await signedIn(request);
    const file = await verb(ctx, await readInput(input, request, params));
    const headers = {
      'cache-control': 'private, no-cache',
      etag: `"${file.mark}"`,
      // Whatever the bytes are, a browser runs nothing of them.
      'content-security-policy': "default-src 'none'; sandbox",
      'x-content-type-options': 'nosniff',
    };
    if (request.headers.get('if-none-match') === headers.etag) {
      return new Response(null, { status: 304, headers });
    }
    return new Response(await file.open(), {
      headers: {
        ...headers,
        'content-type': file.mediaType,
        'content-length': String(file.bytes),
        'content-disposition': contentDisposition(
          file.isSaved ? 'attachment' : 'inline',
          file.name,
        ),
      },
    });
  });
}

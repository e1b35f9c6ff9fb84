import { Refusal } from './problem-response';

/** The body of an upload, at most so many bytes: a longer one is let go as soon as it shows. */
export async function readBytes(request: Request, most: number): Promise<Uint8Array<ArrayBuffer>> {
  const declared = Number(request.headers.get('content-length') ?? 0);
  if (declared > most) throw tooLarge(most);
  const parts: Uint8Array[] = [];
  let total = 0;
  const reader = request.body?.getReader();
  for (let read = await reader?.read(); read && !read.done; read = await reader?.read()) {
    total += read.value.length;
    if (total > most) {
      await reader?.cancel();
      throw tooLarge(most);
    }
    parts.push(read.value);
  }
  const bytes = new Uint8Array(total);
  let at = 0;
  for (const part of parts) {
    bytes.set(part, at);
    at += part.length;
  }
  return bytes;
}

function tooLarge(most: number): Refusal {
  return new Refusal({
    status: 413,
    code: 'too-large',
    message: `This file is larger than ${most / 1e6} MB. Nothing was kept; send a smaller one.`,
  });
}

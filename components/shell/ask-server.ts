import { type ProblemDetails, readProblemDetails } from '@/lib/problem-details';

/** Thrown by `askServer`; carries what a form or a notice shows. */
export class RequestProblem extends Error {
  constructor(readonly problem: ProblemDetails) {
    super(problem.title);
    this.name = 'RequestProblem';
  }
}

type Ask = {
  method?: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';
  body?: unknown;
  signal?: AbortSignal;
};

/** One request to our own server. Every refusal, and no answer at all, comes as a RequestProblem. */
export async function askServer<Answer>(path: string, ask: Ask = {}): Promise<Answer> {
  const response = await send(path, ask);
  const body = await readBody(response);
  if (!response.ok) {
    throw new RequestProblem(readProblemDetails(body) ?? unreadProblem(response.status));
  }
  return body as Answer;
}

/** What to show for anything caught around a request. */
export function problemOf(caught: unknown): ProblemDetails {
  return caught instanceof RequestProblem ? caught.problem : unreadProblem(500);
}

async function send(path: string, { method, body, signal }: Ask): Promise<Response> {
  try {
    return await fetch(path, {
      method: method ?? (body === undefined ? 'GET' : 'POST'),
      headers: body === undefined ? undefined : { 'content-type': 'application/json' },
      body: body === undefined ? undefined : JSON.stringify(body),
      signal,
    });
  } catch (cause) {
    // Taken back by the screen itself, as when the next letter is typed: nothing to tell anybody.
    if (signal?.aborted) throw cause;
    throw new RequestProblem({
      type: 'no-connection',
      title: 'No connection',
      status: 0,
      detail: 'What you typed is still here. Try again when there is a signal.',
    });
  }
}

async function readBody(response: Response): Promise<unknown> {
  const text = await response.text();
  try {
    return text === '' ? null : JSON.parse(text);
  } catch {
    return null;
  }
}

function unreadProblem(status: number): ProblemDetails {
  return {
    type: 'about:blank',
    title: 'Something went wrong',
    status,
    detail: 'What you typed is still here. Try again in a minute.',
  };
}

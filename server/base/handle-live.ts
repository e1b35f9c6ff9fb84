/** The stream of changes of a shop to one screen of it (WHATWG HTML, 9.2, server-sent events). */
import { type LiveTopic, liveEvent } from '@/lib/contracts/live';
import type { PersonContext } from './context';
import { answering, type RouteHandler, signedIn } from './handle';
import { changedLately, hearShop } from './live-bus';

export type LiveTimes = {
  /** Changes that come together are told together. */
  gatherMs: number;
  /** A line now and then keeps what stands between from cutting a silent connection. */
  beatMs: number;
  /** A page may have been drawn so long before it listens: what changed meanwhile is told at once. */
  missedMs: number;
  /** Then the screen asks again, and is asked who it is again. */
  mostMs: number;
};

const usualTimes: LiveTimes = {
  gatherMs: 100,
  beatMs: 20_000,
  missedMs: 10_000,
  mostMs: 600_000,
};
const retryMs = 3_000;

export function handleLive(times: LiveTimes = usualTimes): RouteHandler {
  return answering(async (request) => {
    const ctx = await signedIn(request);
    return new Response(streamOf(ctx, request.signal, times), {
      headers: {
        'content-type': 'text/event-stream; charset=utf-8',
        'cache-control': 'no-store, no-transform',
        // A proxy that gathers an answer before it hands it on would make it late.
        'x-accel-buffering': 'no',
      },
    });
  });
}

function streamOf(ctx: PersonContext, signal: AbortSignal, times: LiveTimes) {
  let stop = () => {};
  return new ReadableStream<Uint8Array>({
    async start(controller) {
      const encoder = new TextEncoder();
      const waiting = new Set<LiveTopic>();
      const timers: NodeJS.Timeout[] = [];
      let isOver = false;
      let gathering: NodeJS.Timeout | undefined;
      const write = (text: string) => {
        if (!isOver) controller.enqueue(encoder.encode(text));
      };
      const tell = () => {
        gathering = undefined;
        for (const topic of waiting) write(`event: ${liveEvent}\ndata: ${topic}\n\n`);
        waiting.clear();
      };
      const hear = (topics: readonly LiveTopic[]) => {
        for (const topic of topics) waiting.add(topic);
        gathering ??= setTimeout(tell, times.gatherMs);
      };
      const end = await hearShop(ctx.shop.id, hear);
      stop = () => {
        if (isOver) return;
        isOver = true;
        end();
        clearTimeout(gathering);
        for (const timer of timers) clearTimeout(timer);
      };
      const finish = () => {
        if (isOver) return;
        stop();
        controller.close();
      };
      if (signal.aborted) return finish();
      signal.addEventListener('abort', finish, { once: true });
      timers.push(setInterval(() => write(': still here\n\n'), times.beatMs));
      timers.push(setTimeout(finish, times.mostMs));
      // The screen fetches once when it hears this: what changed while it was away is not told again.
      write(`retry: ${retryMs}\n\n`);
      hear(changedLately(ctx.shop.id, times.missedMs));
    },
    cancel: () => stop(),
  });
}

/**
 * One stream of changes a tab. It is open while the tab can be seen (a browser holds six connections to one
 * server, and many tabs would use them up), and tells "all" whenever something may have been missed.
 */
import { isLiveTopic, type LiveTopic, liveEvent } from '@/lib/contracts/live';
import { apiPaths } from '@/lib/paths';

export type LiveNews = LiveTopic | 'all';
type Hear = (news: LiveNews) => void;

const againMs = { first: 5_000, most: 60_000 };

/** A page that another leads to may have been drawn so long before it listens. */
const missedMs = 5_000;

const hearers = new Set<Hear>();
const toldAtMs = new Map<LiveNews, number>();
let source: EventSource | null = null;
let hasBeenOpen = false;
let againTimer: ReturnType<typeof setTimeout> | undefined;
let waitMs = againMs.first;

/** Hears the shop's changes until the function that it gives is called. */
export function hearLive(hear: Hear): () => void {
  hearers.add(hear);
  for (const [news, atMs] of toldAtMs) if (performance.now() - atMs < missedMs) hear(news);
  if (hearers.size === 1) {
    document.addEventListener('visibilitychange', follow);
    follow();
  }
  return () => {
    hearers.delete(hear);
    if (hearers.size > 0) return;
    document.removeEventListener('visibilitychange', follow);
    close();
  };
}

function follow(): void {
  if (document.visibilityState === 'hidden') close();
  else if (!source) open();
}

function open(): void {
  clearTimeout(againTimer);
  source = new EventSource(apiPaths.live());
  source.addEventListener('open', () => {
    waitMs = againMs.first;
    if (hasBeenOpen) tell('all');
    hasBeenOpen = true;
  });
  source.addEventListener(liveEvent, (event) => {
    const { data } = event as MessageEvent<string>;
    if (isLiveTopic(data)) tell(data);
  });
  source.addEventListener('error', () => {
    // A stream that only broke off is opened again by the browser; one that was refused is not.
    if (source?.readyState !== EventSource.CLOSED) return;
    close();
    againTimer = setTimeout(follow, waitMs);
    waitMs = Math.min(waitMs * 2, againMs.most);
  });
}

function close(): void {
  clearTimeout(againTimer);
  source?.close();
  source = null;
}

function tell(news: LiveNews): void {
  toldAtMs.set(news, performance.now());
  for (const hear of hearers) hear(news);
}

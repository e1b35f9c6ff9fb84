import type { DayEvent } from '@/lib/contracts/day-events';
import type { SnagView } from '@/lib/contracts/snags';
import type { StopView } from '@/lib/contracts/stops';

/** Who tapped, in words for the list; the office's own words come with its next answer. */
export type Tapper = { personName: string; momentWords: (at: string) => string };

/**
 * A stop as this phone knows it: what the office last showed, and over it the taps that it may not have
 * had yet. A tap that the office's answer already holds changes nothing.
 *
 * Example: the office shows no snag, the phone keeps one: the list shows it as found now, by its holder.
 */
export function stopOnPhone(stop: StopView, events: readonly DayEvent[], tapper: Tapper): StopView {
  return [...events]
    .filter(({ visitId }) => visitId === stop.visitId)
    .reduce((view, event) => withEvent(view, event, tapper), stop);
}

function withEvent(stop: StopView, event: DayEvent, tapper: Tapper): StopView {
  switch (event.what) {
    case 'pause':
    case 'go-on': {
      const why = event.what === 'pause' ? event.why : null;
      const isKnown = stop.pauses.some(({ what, at }) => what === event.what && at === event.at);
      if (isKnown) return stop;
      return { ...stop, pauses: [...stop.pauses, { what: event.what, why, at: event.at }] };
    }
    case 'check': {
      const { item, answer, words, at } = event;
      const known = stop.checks.find((check) => check.item === item);
      if (known && known.at >= at) return stop;
      const others = stop.checks.filter((check) => check.item !== item);
      return { ...stop, checks: [...others, { item, answer, words, at }] };
    }
    case 'snag': {
      if (stop.snags.some(({ id }) => id === event.id)) return stop;
      return { ...stop, snags: [newSnag(stop, event, tapper), ...stop.snags] };
    }
    case 'close-snag':
      return {
        ...stop,
        snags: stop.snags.map((snag) =>
          snag.id === event.snagId && snag.closedAt === null
            ? {
                ...snag,
                closedAt: event.at,
                closedWords: event.words,
                closedPhotoIds: event.photoIds,
                closedBy: tapper.personName,
              }
            : snag,
        ),
      };
    case 'as-found': {
      const sheet = stop.sheets.find(({ release }) => release.id === event.releaseId);
      if (!sheet || stop.asFound.some(({ id }) => id === event.id)) return stop;
      const { id, at, releaseId, readings } = event;
      const roomId = sheet.wallBook.room.id;
      const found = { id, roomId, releaseId, readings, at, ...event.said };
      return { ...stop, asFound: [...stop.asFound, found] };
    }
    case 'sign-off': {
      if (stop.signOff) return stop;
      const { id, visitId, name, language, statement, strokes, snags, at } = event;
      const signOff = {
        ...{ id, visitId, name, language, statement, strokes, snags },
        signedAt: at,
        signedWords: tapper.momentWords(at),
        takenBy: tapper.personName,
        isUntouched: true,
      };
      return { ...stop, signOff };
    }
    case 'code-seen':
      return stop;
  }
}

function newSnag(
  stop: StopView,
  event: Extract<DayEvent, { what: 'snag' }>,
  { personName, momentWords }: Tapper,
): SnagView {
  const { id, kind, roomId, unitId, place, words, mender, dueOn, photoIds, at } = event;
  const room = stop.sheets.find(({ wallBook }) => wallBook.room.id === roomId);
  return {
    ...{ id, kind, roomId, unitId, place, words, mender, dueOn, photoIds },
    jobId: stop.jobId,
    jobNumber: 0,
    customerName: '',
    roomName: room?.roomName ?? null,
    dueWords: dueOn,
    isLate: false,
    foundBy: personName,
    foundAt: at,
    foundWords: `${personName}, ${momentWords(at)}`,
    isAfterSignOff: stop.signOff !== null && stop.signOff.signedAt < at,
    benchSays: '',
    benchReadyOn: null,
    closedAt: null,
    closedWords: '',
    closedPhotoIds: [],
    closedBy: null,
  };
}

/**
 * A newer answer of the office over the one that the phone kept: a tap that reached the office between its
 * answer and now does not vanish from the screen.
 */
export function newerStop(kept: StopView | null, fresh: StopView): StopView {
  if (!kept) return fresh;
  const knownSnags = new Set(fresh.snags.map(({ id }) => id));
  const knownFound = new Set(fresh.asFound.map(({ id }) => id));
  const checks = new Map(fresh.checks.map((check) => [check.item, check]));
  for (const check of kept.checks) {
    const known = checks.get(check.item);
    if (!known || known.at < check.at) checks.set(check.item, check);
  }
  const pauseKey = ({ what, at }: StopView['pauses'][number]) => `${what} ${at}`;
  const knownPauses = new Set(fresh.pauses.map(pauseKey));
  return {
    ...fresh,
    checks: [...checks.values()],
    pauses: [...fresh.pauses, ...kept.pauses.filter((one) => !knownPauses.has(pauseKey(one)))],
    snags: [
      ...fresh.snags.map((snag) => closedSince(kept, snag)),
      ...kept.snags.filter(({ id }) => !knownSnags.has(id)),
    ],
    asFound: [...fresh.asFound, ...kept.asFound.filter(({ id }) => !knownFound.has(id))],
    signOff: fresh.signOff ?? kept.signOff,
  };
}

function closedSince(kept: StopView, snag: SnagView): SnagView {
  const before = kept.snags.find(({ id }) => id === snag.id);
  return snag.closedAt === null && before && before.closedAt !== null ? before : snag;
}

/** A road service that speaks the OSRM HTTP protocol, v1 (project-osrm.org/docs, "table" and "route"). */
import { z } from 'zod';
import type { LatLon } from '@/lib/travel/place';
import { askJson } from '@/server/ports/http/ask-json';
import type { TravelAnswer, TravelPort, TravelRefusal } from './travel-port';

export type OsrmSettings = {
  /** Where the service is: https://roads.example */
  baseUrl: string;
  timeoutMs?: number;
  /** After no answer, how long nobody is kept waiting for the next one. */
  restMs?: number;
};

const USUAL_TIMEOUT_MS = 4_000;
const USUAL_REST_MS = 20_000;
/** A service takes 100 coordinates in one table unless it was started with more. */
const MOST_COORDINATES = 100;
const HALF = MOST_COORDINATES / 2;

const tableAnswer = z.object({
  code: z.literal('Ok'),
  durations: z.array(z.array(z.number().nullable())),
});
const routeAnswer = z.object({
  code: z.literal('Ok'),
  routes: z
    .array(
      z.object({
        geometry: z.object({ coordinates: z.array(z.tuple([z.number(), z.number()])) }),
        legs: z.array(z.object({ duration: z.number() })),
      }),
    )
    .min(1),
});
const refusalAnswer = z.object({ code: z.string(), message: z.string().default('') });

export function osrmTravel(settings: OsrmSettings): TravelPort {
  const { baseUrl, timeoutMs = USUAL_TIMEOUT_MS, restMs = USUAL_REST_MS } = settings;
  let restsUntil = 0;

  async function ask<T>(
    service: 'table' | 'route',
    points: LatLon[],
    query: Record<string, string>,
    answer: z.ZodType<T>,
  ): Promise<TravelAnswer<T>> {
    if (Date.now() < restsUntil) return refused('unreachable', 'It did not answer a moment ago.');
    const coordinates = points.map(({ lat, lon }) => `${lon},${lat}`).join(';');
    const url = new URL(`${baseUrl.replace(/\/$/, '')}/${service}/v1/driving/${coordinates}`);
    // A comma and a semicolon stand as they are: the protocol reads them before anything is decoded.
    url.search = Object.entries(query)
      .map(([name, value]) => `${name}=${value}`)
      .join('&');
    const got = await askJson(url, { timeoutMs, userAgent: 'Setwell' });
    if (!got.ok) {
      if (got.reason !== 'refused') restsUntil = Date.now() + restMs;
      const said = refusalAnswer.safeParse(got.body).data;
      return refused(got.reason, said ? `${said.code}: ${said.message}` : `${got.status ?? ''}`);
    }
    const read = answer.safeParse(got.body);
    return read.success
      ? { ok: true, value: read.data }
      : refused('no-answer', 'The answer is not a table or route of the protocol.');
  }

  async function block(from: LatLon[], to: LatLon[]): Promise<TravelAnswer<(number | null)[][]>> {
    const numbers = (start: number, count: number) =>
      Array.from({ length: count }, (_, index) => start + index).join(';');
    const got = await ask(
      'table',
      [...from, ...to],
      {
        sources: numbers(0, from.length),
        destinations: numbers(from.length, to.length),
        annotations: 'duration',
      },
      tableAnswer,
    );
    if (!got.ok) return got;
    const { durations } = got.value;
    const isWhole =
      durations.length === from.length && durations.every((row) => row.length === to.length);
    if (!isWhole) return refused('no-answer', 'The table has not the size that was asked for.');
    const minutes = durations.map((row) => row.map((s) => (s === null ? null : s / 60)));
    return { ok: true, value: minutes };
  }

  /** One pin in the sea makes the service refuse the whole table: it is asked again without it. */
  async function blockWithoutLost(from: LatLon[], to: LatLon[]) {
    const lost = new Set<number>();
    const all = [...from, ...to];
    for (;;) {
      const isKept = (index: number) => !lost.has(index);
      const keptFrom = from.filter((_, index) => isKept(index));
      const keptTo = to.filter((_, index) => isKept(index + from.length));
      if (keptFrom.length === 0 || keptTo.length === 0) {
        return { ok: true, value: from.map(() => to.map(() => null)) } as const;
      }
      const got = await block(keptFrom, keptTo);
      if (got.ok) return { ok: true, value: spread(got.value, from, to, isKept) } as const;
      const named = lostCoordinate(got.refusal);
      const kept = all.map((_, index) => index).filter(isKept);
      const index = named === null ? undefined : kept[named];
      if (index === undefined) return got;
      lost.add(index);
    }
  }

  return {
    async table({ from, to }) {
      const rows: (number | null)[][] = from.map(() => []);
      for (let top = 0; top < from.length; top += HALF) {
        for (let left = 0; left < to.length; left += HALF) {
          const some = from.slice(top, top + HALF);
          const got = await blockWithoutLost(some, to.slice(left, left + HALF));
          if (!got.ok) return got;
          for (const [index, row] of got.value.entries()) rows[top + index]?.push(...row);
        }
      }
      return { ok: true, value: rows };
    },

    async route(points) {
      const query = { overview: 'full', geometries: 'geojson', steps: 'false' };
      const got = await ask('route', points, query, routeAnswer);
      if (!got.ok) return got;
      const [route] = got.value.routes;
      if (!route) return refused('no-answer', 'The answer has no route.');
      return {
        ok: true,
        value: {
          line: route.geometry.coordinates.map(([lon, lat]) => ({ lat, lon })),
          legMinutes: route.legs.map(({ duration }) => duration / 60),
        },
      };
    },
  };
}

/** "NoSegment: Could not find a matching segment for coordinate 2" → 2 */
function lostCoordinate({ reason, message }: TravelRefusal): number | null {
  if (reason !== 'refused' || !message.startsWith('NoSegment')) return null;
  const named = /coordinate (\d+)/.exec(message);
  return named ? Number(named[1]) : null;
}

function spread(
  minutes: (number | null)[][],
  from: LatLon[],
  to: LatLon[],
  isKept: (index: number) => boolean,
): (number | null)[][] {
  const rows = minutes.values();
  return from.map((_, index) => {
    const cells = (isKept(index) ? (rows.next().value ?? []) : []).values();
    return to.map((_, at) => (isKept(at + from.length) ? (cells.next().value ?? null) : null));
  });
}

function refused(reason: TravelRefusal['reason'], message: string) {
  return { ok: false, refusal: { reason, message } } as const;
}

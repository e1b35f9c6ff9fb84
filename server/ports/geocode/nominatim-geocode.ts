/** An address service that speaks Nominatim's search protocol (nominatim.org/release-docs, "Search"). */
import { setTimeout as wait } from 'node:timers/promises';
import { z } from 'zod';
import type { FoundPlace } from '@/lib/contracts/travel';
import { askJson } from '@/server/ports/http/ask-json';
import type { GeocodePort } from './geocode-port';

export type NominatimSettings = {
  baseUrl: string;
  /** Who asks: a public service refuses those who do not say. */
  userAgent: string;
  timeoutMs?: number;
  /** Between two questions. A public service allows one a second (operations.osmfoundation.org). */
  gapMs?: number;
};

const USUAL_TIMEOUT_MS = 4_000;
const USUAL_GAP_MS = 1_000;
/** Whoever is farther back in the line puts the pin by hand sooner. */
const LONGEST_WAIT_MS = 5_000;
const MOST_PLACES = 5;

const degrees = z.coerce.number();
const searchAnswer = z.array(
  z.object({
    lat: degrees.pipe(z.number().min(-90).max(90)),
    lon: degrees.pipe(z.number().min(-180).max(180)),
    display_name: z.string(),
    address: z.record(z.string(), z.string()).default({}),
  }),
);

export function nominatimGeocode(settings: NominatimSettings): GeocodePort {
  const { baseUrl, userAgent, timeoutMs = USUAL_TIMEOUT_MS, gapMs = USUAL_GAP_MS } = settings;
  let nextTurnAt = 0;

  /** False when the line is too long. */
  async function takeTurn(): Promise<boolean> {
    const now = Date.now();
    const turnAt = Math.max(now, nextTurnAt);
    if (turnAt - now > LONGEST_WAIT_MS) return false;
    nextTurnAt = turnAt + gapMs;
    if (turnAt > now) await wait(turnAt - now);
    return true;
  }

  return {
    async find({ text, country }) {
      if (!(await takeTurn())) return { ok: false, reason: 'busy' };
      const url = new URL(`${baseUrl.replace(/\/$/, '')}/search`);
      url.search = new URLSearchParams({
        q: text,
        format: 'jsonv2',
        addressdetails: '1',
        limit: String(MOST_PLACES),
        ...(country ? { countrycodes: country.toLowerCase() } : {}),
      }).toString();
      const got = await askJson(url, { timeoutMs, userAgent });
      if (!got.ok) return { ok: false, reason: got.reason };
      const read = searchAnswer.safeParse(got.body);
      if (!read.success) return { ok: false, reason: 'no-answer' };
      return { ok: true, places: read.data.map(placeOf) };
    },
  };
}

function placeOf({ lat, lon, display_name, address }: z.output<typeof searchAnswer>[number]) {
  const nearness = address.house_number ? 'house' : address.road ? 'street' : 'area';
  return { lat, lon, label: display_name, nearness } satisfies FoundPlace;
}

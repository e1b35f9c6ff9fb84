/** Who hears of changes, by shop: one LISTEN a process, however many screens are open. */
import { isLiveTopic, type LiveTopic, liveTopics } from '@/lib/contracts/live';
import { database } from './database';

/** The triggers of `drizzle/0009_live.sql` tell it "shop topic". */
const channel = 'setwell_live';

type Hear = (topics: readonly LiveTopic[]) => void;
type Bus = {
  hearers: Map<string, Set<Hear>>;
  /** When each "shop topic" changed last, by this process's own clock. */
  changedAtMs: Map<string, number>;
  listening: Promise<unknown>;
};

/** Held for the process: the bundler makes several copies of this module. */
const held = globalThis as typeof globalThis & { __setwellLive?: Bus };

/** Hears what is committed in a shop from now on; gives what ends it. */
export async function hearShop(shopId: string, hear: Hear): Promise<() => void> {
  held.__setwellLive ??= startBus();
  const { hearers, listening } = held.__setwellLive;
  try {
    await listening;
  } catch (error) {
    held.__setwellLive = undefined;
    throw error;
  }
  const ofShop = hearers.get(shopId) ?? new Set<Hear>();
  hearers.set(shopId, ofShop.add(hear));
  return () => {
    ofShop.delete(hear);
    if (ofShop.size === 0) hearers.delete(shopId);
  };
}

/** What changed in a shop within so long before now, as far as this process has listened. */
export function changedLately(shopId: string, withinMs: number): LiveTopic[] {
  const since = performance.now() - withinMs;
  return liveTopics.filter(
    (topic) => (held.__setwellLive?.changedAtMs.get(`${shopId} ${topic}`) ?? -Infinity) > since,
  );
}

function startBus(): Bus {
  const hearers: Bus['hearers'] = new Map();
  const changedAtMs: Bus['changedAtMs'] = new Map();
  const listening = database().then((open) =>
    open.listen(channel, (payload) => {
      // Nothing said: the connection was away, and anything may have changed in any shop.
      if (payload === '') {
        for (const ofShop of hearers.values()) for (const hear of ofShop) hear(liveTopics);
        return;
      }
      const [shopId = '', topic = ''] = payload.split(' ');
      if (!isLiveTopic(topic)) return;
      changedAtMs.set(payload, performance.now());
      for (const hear of hearers.get(shopId) ?? []) hear([topic]);
    }),
  );
  return { hearers, changedAtMs, listening };
}

import { randomUUID } from 'node:crypto';
import type { FitView, WallBookView } from '@/lib/contracts/rooms';
import type { Tool } from '@/lib/contracts/wall-book';
import { apiPaths } from '@/lib/paths';
import { toLocal } from '@/lib/time/local-moment';
import { getAt } from './ask-at';
import { crookedKitchen } from './crooked-kitchen';
import { openShopOfToday, type ShopOfToday } from './shop-of-today';

export type CrewDayShop = ShopOfToday & { installId: string; roomId: string; accessCode: string };

/** The same shop, with a kitchen released and its install booked for today; its owner is the crew. */
export async function openCrewDayShop(baseUrl: string, personName: string): Promise<CrewDayShop> {
  const shop = await openShopOfToday(baseUrl, personName);
  const { jobId } = shop;
  const roomId = await releaseKitchen(shop);
  const accessCode = '4471#';
  await getAt(shop, apiPaths.forCrew(jobId), {
    method: 'PATCH',
    body: { accessCode, parking: 'In the lane behind', finish: 'White oak, matt' },
  });
  const people = await getAt<{ id: string }[]>(shop, apiPaths.people());
  const crew = await getAt<{ id: string }>(shop, apiPaths.crews(), {
    body: {
      name: 'Fitters',
      does: 'fit',
      colour: '2',
      personIds: people.map(({ id }) => id),
    },
  });
  // After the measure that the same person has booked.
  const soon = toLocal(new Date(Date.now() + 100 * 60_000), shop.zone);
  const install = await getAt<{ id: string }>(shop, apiPaths.visits(), {
    body: {
      idempotencyKey: randomUUID(),
      jobId,
      kind: 'install',
      crewId: crew.id,
      date: soon.date,
      time: soon.time.slice(0, 5),
      workMinutes: 120,
      overrideReason: 'A test of today.',
    },
  });
  return { ...shop, installId: install.id, roomId, accessCode };
}

/** Draws, reads, lays out and releases a kitchen that is out of true, with the shop's own tools. */
async function releaseKitchen(shop: ShopOfToday): Promise<string> {
  const kitchen = crookedKitchen({ newId: randomUUID });
  const { room, readings, tools } = kitchen.wallBook;
  const blank = await getAt<WallBookView>(shop, apiPaths.blankBook(shop.jobId, room.id));
  const own = (toolId: string): string => {
    const kind = tools.find(({ id }) => id === toolId)?.spec.kind;
    const found = blank.tools.find((tool: Tool) => tool.spec.kind === kind) ?? blank.tools[0];
    return found?.id ?? toolId;
  };
  await getAt(shop, apiPaths.rooms(), { body: { jobId: shop.jobId, room } });
  await getAt(shop, apiPaths.readings(), {
    body: {
      roomId: room.id,
      readings: readings.map((reading) => ({ ...reading, toolId: own(reading.toolId) })),
    },
  });
  await getAt(shop, apiPaths.runs(room.id), { body: { runs: kitchen.runs } });
  const fit = await getAt<FitView>(shop, apiPaths.fit(room.id));
  await getAt(shop, apiPaths.sheets(), {
    body: {
      roomId: room.id,
      overrideReason: 'A test of today.',
      seenReadingIds: fit.fit.readingIds,
      seenRunsMark: fit.runsMark,
    },
  });
  return room.id;
}

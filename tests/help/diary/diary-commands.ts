import fc from 'fast-check';
import { bookVisit } from '@/server/visits/book-visit';
import { callOffVisit } from '@/server/visits/call-off-visit';
import { holdOpening } from '@/server/visits/hold-opening';
import { letGoHeldTime } from '@/server/visits/let-go-held-time';
import { moveVisit } from '@/server/visits/move-visit';
import { takeHeldTime } from '@/server/visits/take-held-time';
import {
  type Actor,
  attempt,
  checkDiary,
  contextIn,
  type DiaryWorld,
  newKey,
  visitsIn,
} from './diary-world';

type Model = { steps: number };
type Place = {
  actor: Actor;
  job: number;
  crew: number;
  day: number;
  quarter: number;
  minutes: number;
};

const dayOf = (day: number) => `2026-12-${String(7 + day).padStart(2, '0')}`;
const timeOf = (quarter: number) => {
  const minutes = 8 * 60 + quarter * 15;
  return `${String(Math.floor(minutes / 60)).padStart(2, '0')}:${String(minutes % 60).padStart(2, '0')}`;
};
const at = <T>(list: readonly T[], index: number): T | undefined => list[index % list.length];

function placed(world: DiaryWorld, { crew, day, quarter, minutes }: Place) {
  return {
    crewId: at(world.crewIds, crew) ?? '',
    date: dayOf(day),
    time: timeOf(quarter),
    workMinutes: minutes,
    overrideReason: 'a test of the diary',
  };
}

async function book(world: DiaryWorld, place: Place) {
  const jobId = at(world.jobIds, place.job) ?? '';
  const ctx = await contextIn(world, place.actor);
  const input = { idempotencyKey: newKey(), jobId, kind: 'site-measure' as const };
  return bookVisit(ctx, { ...input, ...placed(world, place) });
}

class Command implements fc.AsyncCommand<Model, DiaryWorld> {
  constructor(
    private readonly words: string,
    private readonly act: (world: DiaryWorld) => Promise<void>,
  ) {}
  check(): boolean {
    return true;
  }
  async run(model: Model, world: DiaryWorld): Promise<void> {
    model.steps += 1;
    await this.act(world);
  }
  toString(): string {
    return this.words;
  }
}

const place = fc.record({
  actor: fc.constantFrom<Actor>('owner', 'scheduler'),
  job: fc.nat(3),
  crew: fc.nat(2),
  day: fc.nat(4),
  quarter: fc.nat(26),
  minutes: fc.constantFrom(45, 90, 240, 700),
});
const which = fc.nat(50);

const booking = place.map(
  (where) =>
    new Command(`book ${JSON.stringify(where)}`, (world) =>
      attempt(world, () => book(world, where)),
    ),
);

const bookingsAtOnce = fc.tuple(place, place).map(
  ([first, second]) =>
    new Command('book twice at once', async (world) => {
      const same = { ...second, crew: first.crew, day: first.day, quarter: first.quarter };
      const results = await Promise.allSettled([book(world, first), book(world, same)]);
      const won = results.filter(({ status }) => status === 'fulfilled').length;
      if (won > 1) throw new Error('two bookings of one crew at one time');
      world.done += won;
      world.refused += 2 - won;
      await checkDiary(world);
    }),
);

const moving = fc.tuple(place, which, fc.boolean()).map(
  ([where, index, isStale]) =>
    new Command(
      `move ${index}${isStale ? ', stale,' : ''} to ${JSON.stringify(where)}`,
      async (world) => {
        const visit = at(await visitsIn(world), index);
        if (!visit) return;
        const version = visit.version - (isStale ? 1 : 0);
        await attempt(world, async () => {
          const ctx = await contextIn(world, where.actor);
          const moved = await moveVisit(ctx, {
            visitId: visit.id,
            version,
            ...placed(world, where),
          });
          if (isStale) throw new Error('a stale move was taken');
          return moved;
        });
      },
    ),
);

const holding = fc.tuple(place, fc.option(which)).map(
  ([where, index]) =>
    new Command(`hold ${JSON.stringify(where)}`, async (world) => {
      const booked = (await visitsIn(world)).filter(({ status }) => status === 'booked');
      const moved = index === null ? undefined : at(booked, index);
      await attempt(world, async () =>
        holdOpening(await contextIn(world, where.actor), {
          idempotencyKey: newKey(),
          jobId: moved?.jobId ?? at(world.jobIds, where.job) ?? '',
          kind: 'site-measure',
          ...(moved ? { forVisitId: moved.id } : {}),
          ...placed(world, where),
        }),
      );
    }),
);

const settling = fc.tuple(which, fc.boolean()).map(
  ([index, isTaken]) =>
    new Command(isTaken ? 'take a held time' : 'let a held time go', async (world) => {
      const held = at(
        (await visitsIn(world)).filter(({ status }) => status === 'held'),
        index,
      );
      if (!held) return;
      const isOver = (held.holdEndsAt?.getTime() ?? 0) <= world.nowMs;
      await attempt(world, async () => {
        const ctx = await contextIn(world, 'scheduler');
        const input = { visitId: held.id };
        await (isTaken ? takeHeldTime(ctx, input) : letGoHeldTime(ctx, input));
        if (isOver) throw new Error('a hold that was over was taken');
      });
    }),
);

const callingOff = which.map(
  (index) =>
    new Command(`call off ${index}`, async (world) => {
      const visit = at(await visitsIn(world), index);
      if (!visit || visit.status === 'held') return;
      const { id: visitId, version } = visit;
      await attempt(world, async () =>
        callOffVisit(await contextIn(world, 'owner'), { visitId, version, reason: 'a test' }),
      );
    }),
);

const waiting = fc.integer({ min: 1, max: 20 }).map(
  (minutes) =>
    new Command(`${minutes} minutes pass`, async (world) => {
      world.nowMs += minutes * 60_000;
    }),
);

/** What people do to a diary, in any order. */
export function diaryCommands(mostSteps: number) {
  const kinds = [booking, bookingsAtOnce, moving, holding, settling, callingOff, waiting];
  return fc.commands(kinds, { maxCommands: mostSteps, size: 'max' });
}

import fc from 'fast-check';
import { expect, it } from 'vitest';
import { diaryCommands } from '../help/diary/diary-commands';
import { type DiaryWorld, makeDiaryWorld } from '../help/diary/diary-world';

/** `npm run bench` asks for thousands of steps; a few are done each time. */
const runs = Number(process.env.SETWELL_DIARY_RUNS ?? 2);
const stepsOfRun = runs > 2 ? 60 : 24;
const seed = 11;

it(
  'a diary that several people book, move, hold, let lapse and call off never sends anybody to two places',
  async () => {
    const worlds: DiaryWorld[] = [];
    await fc.assert(
      fc.asyncProperty(diaryCommands(stepsOfRun), async (commands) => {
        const world = await makeDiaryWorld();
        worlds.push(world);
        await fc.asyncModelRun(() => ({ model: { steps: 0 }, real: world }), commands);
      }),
      { numRuns: runs, seed, endOnFailure: true },
    );
    const sum = (of: (world: DiaryWorld) => number) =>
      worlds.reduce((total, world) => total + of(world), 0);
    const [done, refused] = [sum((world) => world.done), sum((world) => world.refused)];
    if (runs > 2) console.info(`${done} changes done, ${refused} refused, none wrong`);
    expect(done).toBeGreaterThan(5);
    expect(refused).toBeGreaterThan(5);
  },
  runs * 200_000,
);

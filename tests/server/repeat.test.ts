import { expect, it } from 'vitest';
import { repeat } from '@/server/base/repeat';

/** A round that lasts until it is let go, and how many have begun and are under way. */
function rounds() {
  const open: (() => void)[] = [];
  let begun = 0;
  return {
    round: () => {
      begun += 1;
      return new Promise<void>((resolve) => {
        open.push(resolve);
      });
    },
    begun: () => begun,
    end: async () => {
      open.shift()?.();
      await new Promise((resolve) => setTimeout(resolve, 5));
    },
  };
}

const never = 1_000_000;

it('does a round at once when kicked, and one more after it however often it was kicked meanwhile', async () => {
  const work = rounds();
  const { kick, stop } = repeat('a test', never, work.round);
  kick();
  expect(work.begun()).toBe(1);
  for (let count = 0; count < 3; count += 1) kick();
  expect(work.begun()).toBe(1);
  await work.end();
  expect(work.begun()).toBe(2);
  await work.end();
  expect(work.begun()).toBe(2);
  await stop();
});

it('stops after the round under way, and a kick wakes it no more', async () => {
  const work = rounds();
  const { kick, stop } = repeat('a test', never, work.round);
  kick();
  kick();
  let isStopped = false;
  const stopped = stop().then(() => {
    isStopped = true;
  });
  await new Promise((resolve) => setTimeout(resolve, 5));
  expect(isStopped).toBe(false);
  await work.end();
  await stopped;
  kick();
  expect(work.begun()).toBe(1);
});

it('goes on by the clock after a round that failed', async () => {
  let begun = 0;
  const { stop } = repeat('a test that fails', 2, async () => {
    begun += 1;
    throw new Error('this round fails');
  });
  await expect.poll(() => begun).toBeGreaterThan(1);
  await stop();
});

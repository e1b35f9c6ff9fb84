import type { PenStrokes } from '@/lib/contracts/sign-offs';
import { PEN_FIELD } from '@/lib/signing/pen-field';

/**
 * A signature as a hand would leave it: a tall first loop, waves for the letters after it, and a line under
 * it; another for each name, the same each time.
 */
export function demoStrokes(name: string): PenStrokes {
  const letters = [...name].map((letter) => letter.charCodeAt(0));
  const seed = letters.reduce((sum, code) => (sum * 31 + code) % 997, 7);
  const baseline = PEN_FIELD.height * 0.62;
  const step = Math.min(26, (PEN_FIELD.width * 0.7) / letters.length);
  const start = PEN_FIELD.width * 0.12;
  const point = (x: number, y: number): [number, number] => [
    Math.round(Math.min(PEN_FIELD.width, Math.max(0, x)) * 10) / 10,
    Math.round(Math.min(PEN_FIELD.height, Math.max(0, y)) * 10) / 10,
  ];
  const loop = turns(14).map((turn) =>
    point(start + 22 * Math.sin(turn + seed), baseline - 34 + 40 * Math.cos(turn)),
  );
  const waves = letters.flatMap((code, at) =>
    turns(5).map((turn, part) =>
      point(
        start + 26 + (at + part / 5) * step,
        baseline - (5 + (code % 19)) * Math.sin(turn) - at * 0.8,
      ),
    ),
  );
  const underEnd = start + 26 + letters.length * step;
  const under = [
    point(start, baseline + 30 + (seed % 9)),
    point((start + underEnd) / 2, baseline + 24),
    point(underEnd, baseline + 28 - (seed % 7)),
  ];
  return [loop, waves, under];
}

/** Once round, in so many steps. */
const turns = (count: number): number[] =>
  Array.from({ length: count }, (_, at) => (at / (count - 1)) * 2 * Math.PI);

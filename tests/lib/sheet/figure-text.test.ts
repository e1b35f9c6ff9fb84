import { describe, expect, it } from 'vitest';
import type { FigureKind, FitFigure } from '@/lib/measure/fit-figure';
import { figureText } from '@/lib/sheet/figure-text';

const inches = { unit: 'in', stepMm: 25.4 / 16 } as const;
const thirtySeconds = { unit: 'in', stepMm: 25.4 / 32 } as const;
const figure = (kind: FigureKind, value: number, U = 1): FitFigure => ({
  kind,
  value,
  u: U / 2,
  U,
  from: [],
});

describe('figureText', () => {
  it('rounds a blank up and an opening of the same size down', () => {
    expect(figureText(figure('filler-blank', 63.1), inches).value).toBe('2 1/2"');
    expect(figureText(figure('clear-opening', 63.1), inches).value).toBe('2 7/16"');
    expect(figureText(figure('filler-width', 63.1), inches).value).toBe('2 1/2"');
  });

  it('leaves a size on its mark, though the fit keeps it to a ten-thousandth only', () => {
    for (let marks = 1; marks < 400; marks += 1) {
      const kept = Math.round((marks * 25.4 * 1e4) / 32) / 1e4;
      const up = figureText(figure('filler-blank', kept, kept), thirtySeconds);
      const down = figureText(figure('clear-opening', kept), thirtySeconds);
      expect(up.value).toBe(down.value);
      expect(up.surely).toBe(up.value);
    }
  });

  it('never shows U smaller than it is', () => {
    expect(figureText(figure('filler-width', 63.5, 0.1), inches).surely).toBe('1/16"');
    expect(figureText(figure('corner-angle', 88.74, 0.11), inches)).toEqual({
      value: '88.7°',
      surely: '0.2°',
    });
  });

  it('writes a negative angle with a minus and nought without one', () => {
    expect(figureText(figure('corner-deviation', -1.26), inches).value).toBe('−1.3°');
    expect(figureText(figure('corner-deviation', -0.01), inches).value).toBe('0.0°');
  });
});

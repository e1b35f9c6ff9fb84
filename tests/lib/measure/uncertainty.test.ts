import { describe, expect, it } from 'vitest';
import type { Tool } from '@/lib/contracts/wall-book';
import {
  angleUncertainty,
  lengthOwnPart,
  lengthUncertainty,
  slopeUncertainty,
  toolCommonPart,
} from '@/lib/measure/uncertainty';

const tool = (spec: Tool['spec']): Tool => ({ id: 'tool', name: 'Tool', spec });
const tape = (accuracyClass: 'I' | 'II' | 'III') =>
  tool({ kind: 'tape', accuracyClass, stepMm: 1, repeatabilityMm: 0.3 });
const mpe = (accuracyClass: 'I' | 'II' | 'III', lengthMm: number, ends: 0 | 1 | 2) =>
  toolCommonPart(tape(accuracyClass), lengthMm, ends) * Math.sqrt(3);

describe('uncertainty of one reading', () => {
  it('takes a tape by its class, its length in metres rounded up, and its bounded ends', () => {
    expect(mpe('II', 5000, 0)).toBeCloseTo(1.3, 9);
    expect(mpe('II', 3200, 0)).toBeCloseTo(1.1, 9);
    expect(mpe('I', 10_000, 0)).toBeCloseTo(1.1, 9);
    expect(mpe('III', 2000, 0)).toBeCloseTo(1.4, 9);
    expect(mpe('II', 3200, 2)).toBeCloseTo(1.5, 9);
    expect(mpe('II', 0, 0)).toBeCloseTo(0.5, 9);
  });

  it('adds step and repeatability as the root of the sum of squares', () => {
    expect(lengthUncertainty(tape('II'), 3200, 2)).toBeCloseTo(0.961, 3);
    expect(lengthOwnPart(tape('II'))).toBeCloseTo(Math.sqrt(1 / 12 + 0.09), 12);
  });

  it('halves what a maker states at 95 %, and divides a limit by √3', () => {
    const laser = { kind: 'laser', mpeMm: 1.5, stepMm: 1, repeatabilityMm: 0 } as const;
    expect(toolCommonPart(tool(laser), 3000, 0)).toBeCloseTo(1.5 / Math.sqrt(3), 12);
    expect(toolCommonPart(tool({ ...laser, statedAt95: true }), 3000, 0)).toBeCloseTo(0.75, 12);
  });

  it('takes an angle finder in degrees and a level over its distance', () => {
    const finder = tool({
      kind: 'angle-finder',
      mpeDeg: 0.1,
      stepDeg: 0.05,
      repeatabilityDeg: 0.05,
    });
    const level = tool({ kind: 'level', mpeMmPerM: 0.5, stepMm: 0.5, repeatabilityMm: 0.2 });
    expect(angleUncertainty(finder)).toBeCloseTo(0.0777, 4);
    expect(slopeUncertainty(level) * 2400).toBeCloseTo(0.6928, 4);
    expect(toolCommonPart(level, 2400, 0)).toBeCloseTo(0.6928, 4);
  });

  it('gives a wide u, never none, for a tool that does not read such a thing', () => {
    const finder = tool({
      kind: 'angle-finder',
      mpeDeg: 0.1,
      stepDeg: 0.05,
      repeatabilityDeg: 0.05,
    });
    expect(lengthUncertainty(finder, 2000, 0)).toBeGreaterThan(
      lengthUncertainty(tape('II'), 2000, 0),
    );
    expect(angleUncertainty(tape('I'))).toBeCloseTo(1 / Math.sqrt(3), 9);
    expect(slopeUncertainty(tape('I'))).toBeCloseTo(0.001 / Math.sqrt(3), 12);
  });
});

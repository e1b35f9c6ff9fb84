/** Frames of runs for tests: true walls unless said. */
import { figure } from '@/lib/measure/figure';
import type { PlaneEnd, RunFrame, WallEnd } from '@/lib/measure/run-frame';

export function wallEnd(over: Partial<WallEnd> & { angleDeg?: number } = {}): WallEnd {
  const { angleDeg = 90, ...rest } = over;
  return {
    meets: 'wall',
    angle: figure(angleDeg, 0, ['angle']),
    lean: figure(0, 0, []),
    bow: figure(0, 0, []),
    usualBowMm: 0,
    wallLengthMm: 3_000,
    points: [],
    ...rest,
  };
}

export function planeEnd(xMm: number, uMm = 0): PlaneEnd {
  return { meets: 'plane', x: figure(xMm, uMm, ['plane']) };
}

export function runFrame(over: Partial<RunFrame> = {}): RunFrame {
  return {
    length: figure(2_400, 0, ['length']),
    zRefMm: 900,
    standOffMm: 0,
    turnDeg: 0,
    left: wallEnd(),
    right: wallEnd(),
    ...over,
  };
}

/** The same run seen in a mirror: left and right change places, turns and leans keep their size. */
export function mirrored(frame: RunFrame): RunFrame {
  const flip = (end: RunFrame['left']): RunFrame['left'] =>
    end.meets === 'plane'
      ? planeEnd(frame.length.value - end.x.value, end.x.u)
      : end.meets === 'run'
        ? { ...end, otherTurnDeg: -end.otherTurnDeg }
        : end;
  const turn = (frame.turnDeg * Math.PI) / 180;
  return {
    ...frame,
    standOffMm: frame.standOffMm + frame.length.value * Math.tan(turn),
    turnDeg: -frame.turnDeg,
    left: flip(frame.right),
    right: flip(frame.left),
  };
}

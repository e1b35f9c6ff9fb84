import { useState } from 'react';
import { keepDraft } from '@/components/phone/draft-store';
import type { ReadingOf, Touches } from '@/lib/contracts/readings';
import type { LengthUnit } from '@/lib/units/brands';
import type { CornerMethod } from '@/lib/walls-pad/pad-fields';
import type { ToolUse } from '@/lib/walls-pad/pad-tools';
import { habitsKey } from './draft-keys';

export type SetUp = { setUpId: string; setUpKind: ReadingOf<'face'>['setUpKind'] };

/** What the measurer chose last, so that it need not be chosen again; kept on this phone. */
export type PadHabits = {
  unit: LengthUnit;
  touches: Touches;
  toolIds: Partial<Record<ToolUse, string>>;
  cornerMethod: CornerMethod;
  studAt: ReadingOf<'stud'>['at'];
  doorwayName: string;
  /** The next question comes by itself once a tick of the tape is touched. */
  goesOn: boolean;
  /** Set-ups begun on this phone, by room and group. */
  setUps: Record<string, SetUp>;
};

export function freshHabits(unit: LengthUnit): PadHabits {
  return {
    unit,
    touches: 'board',
    toolIds: {},
    cornerMethod: 'legs',
    studAt: 'centre',
    doorwayName: 'Front door',
    goesOn: true,
    setUps: {},
  };
}

export function useHabits(kept: PadHabits): [PadHabits, (change: Partial<PadHabits>) => void] {
  const [habits, setHabits] = useState(kept);
  const change = (part: Partial<PadHabits>) => {
    const next = { ...habits, ...part };
    setHabits(next);
    keepDraft(habitsKey, next);
  };
  return [habits, change];
}

export const setUpKey = (roomId: string, group: string): string => `${roomId}/${group}`;

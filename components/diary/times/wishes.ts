import { noWishes, type OpeningWishes } from '@/lib/contracts/openings';

/** What the customer says on the phone, as toggles and one time. */
export type Wishes = {
  weekdays: number[];
  half: 'morning' | 'afternoon' | null;
  notBefore: string;
  isSchoolRun: boolean;
  /** First day that suits; empty: as soon as may be. */
  from: string;
};

export const anyTime: Wishes = {
  weekdays: [],
  half: null,
  notBefore: '',
  isSchoolRun: false,
  from: '',
};

/** Common practice: a morning visit has arrived by noon, an afternoon one arrives after it. */
const noon = '12:00';
/** Common practice: when children are brought to school and fetched. */
const schoolRun = [
  { from: '08:00', until: '09:00' },
  { from: '14:30', until: '15:45' },
];

export function askedWishes(wishes: Wishes): OpeningWishes {
  const { weekdays, half, notBefore, isSchoolRun } = wishes;
  const earliest = half === 'afternoon' && notBefore < noon ? noon : notBefore;
  return {
    ...noWishes,
    weekdays,
    ...(earliest ? { notBefore: earliest } : {}),
    ...(half === 'morning' ? { notAfter: noon } : {}),
    away: isSchoolRun ? schoolRun : [],
  };
}

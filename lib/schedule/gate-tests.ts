/** Each gate by itself: passed, passed from a date, or blocked, in the trade's words. */
import { addDays, type LocalDate } from '@/lib/time/civil';
import { addWorkdays, workdayOnOrAfter } from '@/lib/time/workdays';
import type { GateInput, GateKey, GateState } from './gate-input';

const passed = (words: string): GateState => ({ state: 'passed', words });
const blocked = (words: string): GateState => ({ state: 'blocked', words });

/** A date that cannot be worked out (a pattern without working days) blocks. */
function from(day: LocalDate | null, words: string): GateState {
  return day === null
    ? blocked('no working days in the shop rules')
    : { state: 'from', from: day, words };
}

export const gateTests: Record<GateKey, (input: GateInput) => GateState> = {
  'site-ready': ({ facts }) => {
    if (facts.wallsReady === 'closed') return passed('walls closed');
    if (facts.wallsReady === 'bare-studs') return passed('bare studs, thickness to come is stated');
    if (facts.siteReadyOn) return from(facts.siteReadyOn, 'walls closed by then');
    return blocked('walls not closed, and no date for it');
  },

  'walls-closed': ({ facts }) => {
    if (facts.wallsReady === 'closed') return passed('walls closed');
    if (facts.siteReadyOn) return from(facts.siteReadyOn, 'walls closed by then');
    return blocked('walls not closed, and no date for it');
  },

  'access-given': ({ facts }) =>
    facts.accessGiven ? passed('way in known') : blocked('nobody said how to get in'),

  'customer-ready': ({ facts }) =>
    facts.notReady.trim() === ''
      ? passed('nothing open from the customer')
      : blocked(`customer says not ready: ${facts.notReady.trim()}`),

  measured: ({ facts }) =>
    facts.measuredOn
      ? from(facts.measuredOn, 'site measured')
      : blocked('site measure not handed in'),

  /** Newer readings matter while the bench can still change what it builds. */
  released: ({ facts: { release, readyOn } }) => {
    if (!release) return blocked('no revision released');
    if (release.isSuperseded && !readyOn) {
      return blocked(`readings are newer than revision ${release.revision}: release again`);
    }
    return passed(`revision ${release.revision} released`);
  },

  'cabinets-ready': ({ facts: { release, readyOn }, rules }) => {
    if (readyOn) return from(readyOn, 'cabinets ready');
    if (!release) return blocked('cabinets not in build');
    const day = addWorkdays(release.releasedOn, rules.leadWorkdays, rules);
    return from(day, `${rules.leadWorkdays} working days after revision ${release.revision}`);
  },

  'floor-agreed': ({ facts }) =>
    facts.floorAgreed
      ? passed('floor agreed')
      : blocked('floor not down and its build-up not agreed'),

  delivered: ({ facts }) =>
    facts.deliveryOn ? from(facts.deliveryOn, 'delivered') : passed('comes with the crew'),

  /** The template may follow at once after the base units are fixed. */
  'bases-set': (input) => {
    if (input.facts.basesSet) return passed('base units set');
    return afterInstall(input, 'base units set');
  },

  installed: (input) => afterInstall(input, 'installed'),
};

/** Booking ahead is usual: a booked install opens the first working day after it. */
function afterInstall({ facts: { install }, rules }: GateInput, words: string): GateState {
  if (!install) return blocked('no install is booked');
  if (install.isDone) return from(install.lastDay, words);
  return from(workdayOnOrAfter(addDays(install.lastDay, 1), rules), 'after the booked install');
}

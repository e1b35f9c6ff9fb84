/**
 * Order of work: what must be so before a visit may be booked. Each gate passes, passes from a date, or is
 * blocked; a scheduler may book against a gate with a written reason, which the caller keeps.
 */
import type { Problem } from '@/lib/problem';
import type { LocalDate } from '@/lib/time/civil';
import { formatLocalDayShort } from '@/lib/time/format-civil';
import type { GateInput, GateKey, GateState } from './gate-input';
import { gateTests } from './gate-tests';
import type { VisitKind } from './visit-kind';

export type Gate = GateState & { key: GateKey };

/** When the visit may be booked, all gates together. */
export type Readiness = {
  state: 'now' | 'from' | 'blocked';
  /** The first day it may take place; null while blocked. */
  from: LocalDate | null;
  /** "cabinets ready", or what blocks it. */
  because: string;
  /** The same with its date: "from Tue, May 12: cabinets ready", "now: …", "not yet: …". */
  words: string;
  gates: Gate[];
};

/** The gates of each kind of visit, in the order in which they are told. */
const gatesOfKind: Record<VisitKind, readonly GateKey[]> = {
  'site-measure': ['site-ready', 'access-given', 'customer-ready'],
  'check-measure': ['measured', 'walls-closed', 'access-given', 'customer-ready'],
  delivery: ['released', 'cabinets-ready', 'access-given', 'customer-ready'],
  install: [
    'released',
    'cabinets-ready',
    'floor-agreed',
    'delivered',
    'access-given',
    'customer-ready',
  ],
  'worktop-template': ['bases-set', 'customer-ready'],
  return: ['installed', 'customer-ready'],
};

/** Taken for granted: told only when it blocks. */
const toldOnlyWhenBlocked: ReadonlySet<GateKey> = new Set<GateKey>([
  'access-given',
  'customer-ready',
]);

/**
 * The gates of a visit, each with its state and the words for it. A date already reached counts as passed.
 * Example: an install released on Mon 2026-05-04 with a lead of 6 working days (Monday to Friday) and
 * nothing said by the bench has 'cabinets-ready' from Tue 2026-05-12.
 */
export function gatesFor(input: GateInput): Gate[] {
  return gatesOfKind[input.kind].map((key) => {
    const gate = gateTests[key](input);
    const isReached = gate.state === 'from' && gate.from <= input.today;
    return isReached ? { key, state: 'passed', words: gate.words } : { key, ...gate };
  });
}

/**
 * All gates as one answer, for the waiting list.
 * Example: one gate from May 8 and one from May 12 give from May 12, with the words of the later one.
 */
export function readinessFor(input: GateInput): Readiness {
  const gates = gatesFor(input);
  const blocked = gates.filter((gate) => gate.state === 'blocked');
  if (blocked.length > 0) {
    const because = wordsOf(blocked);
    return { state: 'blocked', from: null, because, words: `not yet: ${because}`, gates };
  }
  const waits = gates.flatMap((gate) => (gate.state === 'from' ? [gate] : []));
  if (waits.length === 0) {
    const because = wordsOf(gates.filter((gate) => !toldOnlyWhenBlocked.has(gate.key)));
    return { state: 'now', from: input.today, because, words: `now: ${because}`, gates };
  }
  const from =
    waits
      .map((gate) => gate.from)
      .toSorted()
      .at(-1) ?? input.today;
  const because = wordsOf(waits.filter((gate) => gate.from === from));
  return { state: 'from', from, because, words: `from ${day(from, input)}: ${because}`, gates };
}

/**
 * What speaks against booking the visit on a day, one problem a gate; none when all gates allow it.
 * Example: an install on 2026-05-11 whose cabinets come on 2026-05-12 gives one, "gate-cabinets-ready".
 */
export function gateProblems(input: GateInput, on: LocalDate): Problem[] {
  return gatesFor(input).flatMap((gate) => {
    if (gate.state === 'passed' || (gate.state === 'from' && gate.from <= on)) return [];
    const since = gate.state === 'from' ? `Not before ${day(gate.from, input)}: ` : '';
    return [problem(gate.key, `${since}${gate.words}.`)];
  });
}

function problem(key: GateKey, words: string): Problem {
  const message = words.charAt(0).toUpperCase() + words.slice(1);
  return { code: `gate-${key}`, message, about: [key], severity: 'error' };
}

function day(date: LocalDate, input: GateInput): string {
  return formatLocalDayShort(date, input.locale);
}

function wordsOf(gates: Gate[]): string {
  return gates.map((gate) => gate.words).join(', ');
}

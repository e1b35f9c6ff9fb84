/** What a booking or a move would be: its pieces, its window, and the gates that stand against it. */
import { gateProblems, type Piece, type VisitKind } from '@/lib/schedule';
import { goesOutFor } from '@/lib/schedule/crew-kinds';
import { splitOverCalendar } from '@/lib/schedule/pieces';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { isLocalDate, type LocalDate } from '@/lib/time/civil';
import { fromLocal, localDate } from '@/lib/time/local-moment';
import type { Context } from '@/server/base/context';
import { Refusal } from '@/server/base/problem-response';
import { bookingDays } from '@/server/shops/booking-days';
import { isAway, whoGoes } from '@/server/shops/crew-plans';
import { estimateMinutes, factsOf } from './job-facts';
import type { JobRecord } from './job-records';
import type { Crew } from './lock-crew';

export type Asked = {
  kind: VisitKind;
  date: LocalDate;
  time: string;
  workMinutes?: number | undefined;
};

export type OpenGate = { gate: string; words: string };

export type Plan = {
  pieces: Piece[];
  startsAt: Date;
  endsAt: Date;
  windowStartsAt: Date;
  windowEndsAt: Date;
  workMinutes: number;
  openGates: OpenGate[];
  /** Unusual, and done as asked: a start before hours, a day off. */
  warnings: string[];
};

export function planVisit(ctx: Context, job: JobRecord, crew: Crew, asked: Asked): Plan {
  const { booking } = ctx.shop.rules;
  const { zone } = ctx.shop;
  if (!isLocalDate(asked.date)) throw cannotBe('date', 'That day does not exist.');
  const startsAt = fromLocal(asked.date, asked.time, zone);
  const going = whoGoes(crew, asked.date);
  // Nobody of the crew is in that day: as long as it takes them all, with the warning beside it.
  const crewSize = going.length || crew.people.length;
  const workMinutes =
    asked.workMinutes ?? estimateMinutes(ctx, job, { kind: asked.kind, crewSize });
  const { value: pieces, problems } = splitOverCalendar({
    workMinutes,
    startsAt,
    calendar: crew.calendar,
    zone,
  });
  const last = pieces?.at(-1);
  if (!pieces || !last) {
    throw cannotBe('time', problems[0]?.message ?? 'The visit does not fit there.');
  }
  if (last.endsAt <= ctx.now) throw cannotBe('date', 'That time is past.');
  return {
    pieces,
    startsAt,
    endsAt: last.endsAt,
    windowStartsAt: startsAt,
    windowEndsAt: new Date(startsAt.getTime() + booking.windowMinutes * 60_000),
    workMinutes,
    openGates: openGates(ctx, job, crew, asked),
    warnings: [...problems.map(({ message }) => message), ...awayWords(crew, asked.date)],
  };
}

/** Refused with the gates, unless the scheduler writes why they are overridden. */
export function mustPassGates(openGates: OpenGate[], overrideReason: string): void {
  if (openGates.length === 0 || overrideReason !== '') return;
  const words = openGates.map((gate) => gate.words).join(' ');
  throw new Refusal({
    status: 409,
    code: 'gate-not-passed',
    message: `Not booked. ${words} Write why it is booked all the same, or take another day.`,
    current: { gates: openGates },
  });
}

function openGates(ctx: Context, job: JobRecord, crew: Crew, asked: Asked): OpenGate[] {
  const problems = gateProblems(
    {
      kind: asked.kind,
      facts: factsOf(ctx, job),
      rules: bookingDays(ctx),
      today: localDate(ctx.now, ctx.shop.zone),
      locale: { language: 'en', region: ctx.shop.region },
    },
    asked.date,
  );
  const gates = problems.map(({ code, message }) => ({
    gate: code.replace(/^gate-/, ''),
    words: message,
  }));
  return [...gates, ...skillGate(crew, asked.kind)];
}

function skillGate(crew: Crew, kind: VisitKind): OpenGate[] {
  if (goesOutFor(crew, kind)) return [];
  const words = `${crew.name} does not go out for this: ${visitKindWords[kind].toLowerCase()}.`;
  return [{ gate: 'crew-skill', words }];
}

/** Said, and booked all the same: the scheduler may know better. */
function awayWords(crew: Crew, date: LocalDate): string[] {
  return crew.people
    .filter((person) => isAway(person, date))
    .map(({ name }) => `${name} is off on that day.`);
}

function cannotBe(field: string, message: string): Refusal {
  return new Refusal({
    status: 422,
    code: 'cannot-be-booked-there',
    message: `Nothing was changed. ${message}`,
    errors: { [field]: message },
  });
}

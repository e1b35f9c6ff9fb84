import type { WaitingItem } from '@/lib/contracts/visits';
import { readinessFor, type VisitKind } from '@/lib/schedule';
import { localDate } from '@/lib/time/local-moment';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { bookingDays } from '@/server/shops/booking-days';
import { estimateMinutes, factsOf, standing } from './job-facts';
import { type JobRecord, openJobs, readJobRecords } from './job-records';

/** Jobs that need a visit booked: what can be booked now first, then by day, then what waits for something. */
export async function getWaitingList(ctx: PersonContext): Promise<WaitingItem[]> {
  mustBeAllowed(ctx, 'visits:book');
  const records = await readJobRecords(ctx.db, ctx, openJobs);
  return records
    .flatMap((job) => {
      const kind = nextKind(job);
      return kind ? [waitingItem(ctx, job, kind)] : [];
    })
    .sort(
      (a, b) =>
        stateOrder[a.state] - stateOrder[b.state] ||
        (a.from ?? '').localeCompare(b.from ?? '') ||
        a.jobNumber - b.jobNumber,
    );
}

const stateOrder = { now: 0, from: 1, blocked: 2 } as const;

/** The visit that a job needs next; null when it is booked, or none is needed. */
function nextKind(job: JobRecord): VisitKind | null {
  const needs = (kind: VisitKind) => (standing(job, kind).length === 0 ? kind : null);
  switch (job.stage) {
    case 'enquiry':
    case 'to-measure':
      return needs('site-measure');
    case 'measured':
    case 'released':
    case 'in-build':
    case 'ready':
      return needs('install');
    case 'snags':
      return standing(job, 'return').some(({ status }) => status !== 'done') ? null : 'return';
    default:
      return null;
  }
}

function waitingItem(ctx: PersonContext, job: JobRecord, kind: VisitKind): WaitingItem {
  const { region, zone } = ctx.shop;
  const readiness = readinessFor({
    kind,
    facts: factsOf(ctx, job),
    rules: bookingDays(ctx),
    today: localDate(ctx.now, zone),
    locale: { language: 'en', region },
  });
  return {
    jobId: job.id,
    jobNumber: job.number,
    kind,
    customerName: job.customerName,
    street: job.street,
    town: job.town,
    jobTitle: job.title,
    workMinutes: estimateMinutes(ctx, job, { kind }),
    state: readiness.state,
    from: readiness.from,
    why: readiness.words,
    openGates: readiness.gates
      .filter(({ state }) => state !== 'passed')
      .map(({ key, words }) => ({ gate: key, words })),
    wish: job.visits.findLast((visit) => visit.kind === kind)?.customerSays ?? '',
  };
}

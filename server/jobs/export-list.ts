import { createHash } from 'node:crypto';
import { asc, eq } from 'drizzle-orm';
import { customers, jobs, sites } from '@/db/schema';
import { type CsvCell, csvText } from '@/lib/export/csv';
import { type JobColumn, jobColumns, jobColumnWords } from '@/lib/import/job-columns';
import { stageWords } from '@/lib/schedule/stages';
import { localDate } from '@/lib/time/local-moment';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import type { FileAnswer } from '@/server/base/handle-file';

const wallWords = { 'not-yet': 'not yet', 'bare-studs': 'bare studs', closed: 'closed' } as const;

/** All customers and jobs in the columns that the import reads, with number and stage before them. */
export async function exportList(ctx: PersonContext): Promise<FileAnswer> {
  mustBeAllowed(ctx, 'jobs:change');
  const rows = await ctx.db
    .select({ job: jobs, customer: customers, site: sites })
    .from(jobs)
    .innerJoin(customers, eq(customers.id, jobs.customerId))
    .innerJoin(sites, eq(sites.id, jobs.siteId))
    .where(eq(jobs.shopId, ctx.shop.id))
    .orderBy(asc(jobs.number));
  const lines: CsvCell[][] = rows.map(({ job, customer, site }) => {
    const cells: Record<JobColumn, CsvCell> = {
      customer: customer.name,
      phone: customer.phone,
      email: customer.email,
      language: customer.language,
      street: site.street,
      town: site.town,
      postcode: site.postcode,
      // As text: numbers are written to four decimals, which is eleven metres.
      latitude: site.latitude === null ? '' : String(site.latitude),
      longitude: site.longitude === null ? '' : String(site.longitude),
      wayIn: site.wayIn,
      floorsUp: site.floorsUp,
      hasLift: site.hasLift ? 'yes' : 'no',
      yearBuilt: site.yearBuilt,
      title: job.title,
      roomCount: job.roomCount,
      unitCount: job.unitCount,
      wallsReady: wallWords[job.wallsReady],
      siteReadyOn: job.siteReadyOn ?? '',
      notes: job.notes,
    };
    return [job.number, stageWords[job.stage], ...jobColumns.map((column) => cells[column])];
  });
  const head = ['Number', 'Stage', ...jobColumns.map((column) => jobColumnWords[column])];
  const bytes = new TextEncoder().encode(csvText([head, ...lines]));
  await ctx.db.transaction((tx) =>
    writeAudit(tx, ctx, {
      verb: 'export-list',
      subjectKind: 'person',
      subjectId: ctx.actor.personId,
      summary: `Took away a list of ${rows.length} jobs`,
    }),
  );
  return {
    open: async () => new Blob([bytes]).stream(),
    mediaType: 'text/csv; charset=utf-8',
    bytes: bytes.byteLength,
    name: `jobs-${localDate(ctx.now, ctx.shop.zone)}.csv`,
    mark: createHash('sha256').update(bytes).digest('base64url'),
    isSaved: true,
  };
}

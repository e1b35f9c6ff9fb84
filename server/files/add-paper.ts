import { and, eq } from 'drizzle-orm';
import { jobs } from '@/db/schema';
import type { AddPaperInput } from '@/lib/contracts/papers';
import { pictureKind } from '@/lib/files/picture-kind';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { countTry } from '@/server/base/limits';
import { notFound, Refusal } from '@/server/base/problem-response';
import { keepFile } from './keep-file';

const limit = { most: 100, windowSeconds: 3_600 };

/** Keeps a plan or a letter as it came. It is a PDF by its bytes, whatever its name says; it is never opened here. */
export async function addPaper(
  ctx: PersonContext,
  input: AddPaperInput & { bytes: Uint8Array },
): Promise<{ fileId: string }> {
  mustBeAllowed(ctx, 'jobs:change');
  const { jobId, fileId, bytes } = input;
  await countTry(ctx.db, `paper:${ctx.actor.personId}`, limit, ctx.now);
  await mustBeOurs(ctx, jobId);
  if (pictureKind(bytes) !== 'pdf' || !endsAsPdf(bytes)) throw notPdf();
  const name = input.name.toLowerCase().endsWith('.pdf') ? input.name : `${input.name}.pdf`;
  return keepFile(
    ctx,
    bytes,
    { id: fileId, jobId, name, mediaType: 'application/pdf', ending: 'pdf', takenAt: ctx.now },
    { verb: 'add-paper', subjectKind: 'file', subjectId: fileId, summary: `Added ${name}` },
  );
}

async function mustBeOurs(ctx: PersonContext, jobId: string): Promise<void> {
  const [job] = await ctx.db
    .select({ id: jobs.id })
    .from(jobs)
    .where(and(eq(jobs.shopId, ctx.shop.id), eq(jobs.id, jobId)));
  if (!job) throw notFound('job');
}

/** The end mark stands in the last kilobyte (ISO 32000-1, 7.5.5): a file cut short has none. */
function endsAsPdf(bytes: Uint8Array): boolean {
  return new TextDecoder('latin1').decode(bytes.subarray(-1_024)).includes('%%EOF');
}

function notPdf(): Refusal {
  return new Refusal({
    status: 415,
    code: 'not-a-paper',
    message: 'Papers are kept as whole PDF files, and this is none. Nothing was kept.',
  });
}

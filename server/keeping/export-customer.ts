import { createHash } from 'node:crypto';
import { strToU8, zipSync } from 'fflate';
import type { CustomerIdInput } from '@/lib/contracts/keeping';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import type { FileAnswer } from '@/server/base/handle-file';
import { notFound } from '@/server/base/problem-response';
import { filesPort } from '@/server/ports/files/choose-files';
import { type CustomerRecord, readCustomerRecord } from './customer-record';

/** Everything of one customer as a zip: the rows as JSON, the photos and papers as they are. */
export async function exportCustomer(
  ctx: PersonContext,
  { customerId }: CustomerIdInput,
): Promise<FileAnswer> {
  mustBeAllowed(ctx, 'customers:export');
  const record = await readCustomerRecord(ctx.db, ctx.shop.id, customerId);
  if (!record) throw notFound('customer');
  const zip = zipSync({
    'customer.json': strToU8(JSON.stringify(record, null, 2)),
    ...(await readBytes(record)),
  });
  await ctx.db.transaction((tx) =>
    writeAudit(tx, ctx, {
      verb: 'export-customer',
      subjectKind: 'customer',
      subjectId: customerId,
      jobId: record.jobs[0]?.id,
      summary: 'Everything of this customer was saved to a file',
    }),
  );
  return {
    name: `customer-${record.jobs[0]?.number ?? customerId}.zip`,
    mediaType: 'application/zip',
    bytes: zip.byteLength,
    mark: createHash('sha256').update(zip).digest('hex'),
    isSaved: true,
    open: async () => new Blob([zip]).stream(),
  };
}

/** One at a time: a job has hundreds of photos at most, and they must not all be read twice over. */
async function readBytes({ files }: CustomerRecord): Promise<Record<string, Uint8Array>> {
  const found: Record<string, Uint8Array> = {};
  const port = await filesPort();
  for (const { id, name, storageKey } of files) {
    const stream = await port.read(storageKey);
    if (!stream) continue;
    const bytes = new Uint8Array(await new Response(stream).arrayBuffer());
    found[`files/${id}-${name.replace(/[^\w.-]+/g, '-')}`] = bytes;
  }
  return found;
}

import { eq } from 'drizzle-orm';
import { signOffs } from '@/db/schema';
import { contentDisposition } from '@/server/base/content-disposition';
import { notFound } from '@/server/base/problem-response';
import { customerContext } from '@/server/visits/customer-context';
import { makeCopy } from './make-copy';

/** What the customer signed, from the link to their visit; any other link finds nothing. */
export async function getCustomerCopy(token: string, from: string): Promise<Response> {
  const ctx = await customerContext(token, from);
  const copy = ctx ? await makeCopy(ctx, eq(signOffs.visitId, ctx.actor.visitId)) : null;
  if (!copy) throw notFound('page');
  return new Response(Buffer.from(copy.bytes), {
    headers: {
      'content-type': 'application/pdf',
      'content-disposition': contentDisposition('inline', copy.fileName),
      'cache-control': 'private, no-store',
      'content-security-policy': "default-src 'none'; sandbox",
      'x-content-type-options': 'nosniff',
    },
  });
}

import { env } from '@/server/base/env';
import { notFound } from '@/server/base/problem-response';
import { getPorts } from '@/server/ports/choose-ports';

/** The fakes behind the demo; outside the demo there is nothing here. */
export async function demoFakes() {
  if (!env().demo) throw notFound('page');
  const { fakes } = await getPorts();
  return fakes;
}

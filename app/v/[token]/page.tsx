import type { Metadata } from 'next';
import { headers } from 'next/headers';
import { notFound } from 'next/navigation';
import { VisitPage } from '@/components/customer/visit-page';
import { directionsHref } from '@/components/phone/directions';
import { callerAddress } from '@/server/base/caller-address';
import { hasCustomerCopy } from '@/server/snags/has-customer-copy';
import { getCustomerVisit } from '@/server/visits/get-customer-visit';

/** No manifest: a customer has nothing to put on a home screen. */
export const metadata: Metadata = { title: 'Your visit', robots: { index: false }, manifest: null };

type Props = { params: Promise<{ token: string }> };

/** Reading it changes nothing: link previews and mail scanners come here too. */
export default async function CustomerVisitPage({ params }: Props) {
  const { token } = await params;
  const sent = await headers();
  const from = callerAddress({ headers: sent });
  const visit = await getCustomerVisit(token, from);
  if (!visit) notFound();
  const hasCopy = await hasCustomerCopy(token, from);
  const mapHref = directionsHref(visit.street, visit.town, sent.get('user-agent') ?? '');
  return <VisitPage visit={visit} token={token} hasCopy={hasCopy} mapHref={mapHref} />;
}

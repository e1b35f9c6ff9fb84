import type { Metadata } from 'next';
import { headers } from 'next/headers';
import { notFound } from 'next/navigation';
import { cache } from 'react';
import { customerWords } from '@/components/customer/customer-words';
import { VisitPage } from '@/components/customer/visit-page';
import { directionsHref } from '@/components/phone/directions';
import { callerAddress } from '@/server/base/caller-address';
import { hasCustomerCopy } from '@/server/snags/has-customer-copy';
import { getCustomerVisit } from '@/server/visits/get-customer-visit';

type Props = { params: Promise<{ token: string }> };

/** Once a request, for the title and for the page. */
const readVisit = cache(getCustomerVisit);

/** No manifest: a customer has nothing to put on a home screen. */
export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { token } = await params;
  const visit = await readVisit(token, callerAddress({ headers: await headers() }));
  const { title } = customerWords(visit?.language ?? 'en');
  return {
    title: visit ? { absolute: `${title} · ${visit.shopName}` } : title,
    robots: { index: false },
    manifest: null,
  };
}

/** Reading it changes nothing: link previews and mail scanners come here too. */
export default async function CustomerVisitPage({ params }: Props) {
  const { token } = await params;
  const sent = await headers();
  const from = callerAddress({ headers: sent });
  const visit = await readVisit(token, from);
  if (!visit) notFound();
  const hasCopy = await hasCustomerCopy(token, from);
  const mapHref = directionsHref(visit.street, visit.town, sent.get('user-agent') ?? '');
  return <VisitPage visit={visit} token={token} hasCopy={hasCopy} mapHref={mapHref} />;
}

import type { Metadata } from 'next';
import { headers } from 'next/headers';
import { notFound } from 'next/navigation';
import { TimesPage } from '@/components/customer/times-page';
import { callerAddress } from '@/server/base/caller-address';
import { getCustomerTimes } from '@/server/visits/get-customer-times';

export const metadata: Metadata = {
  title: 'Another time',
  robots: { index: false },
  manifest: null,
};

type Props = {
  params: Promise<{ token: string }>;
  searchParams: Promise<{ taken?: string }>;
};

/** Reading it holds nothing: a time is kept by a tap, which posts. */
export default async function CustomerTimesPage({ params, searchParams }: Props) {
  const { token } = await params;
  const { taken } = await searchParams;
  const view = await getCustomerTimes(token, callerAddress({ headers: await headers() }));
  if (!view) notFound();
  return <TimesPage view={view} token={token} wasTaken={taken !== undefined} />;
}

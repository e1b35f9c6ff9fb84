import type { Metadata } from 'next';
import { headers } from 'next/headers';
import { notFound } from 'next/navigation';
import { cache } from 'react';
import { customerWords } from '@/components/customer/customer-words';
import { TimesPage } from '@/components/customer/times-page';
import { callerAddress } from '@/server/base/caller-address';
import { getCustomerTimes } from '@/server/visits/get-customer-times';

type Props = {
  params: Promise<{ token: string }>;
  searchParams: Promise<{ taken?: string }>;
};

/** Once a request, for the title and for the page. */
const readTimes = cache(getCustomerTimes);

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const { token } = await params;
  const view = await readTimes(token, callerAddress({ headers: await headers() }));
  const { timesTitle } = customerWords(view?.language ?? 'en');
  return {
    title: view ? { absolute: `${timesTitle} · ${view.shopName}` } : timesTitle,
    robots: { index: false },
    manifest: null,
  };
}

/** Reading it holds nothing: a time is kept by a tap, which posts. */
export default async function CustomerTimesPage({ params, searchParams }: Props) {
  const { token } = await params;
  const { taken } = await searchParams;
  const view = await readTimes(token, callerAddress({ headers: await headers() }));
  if (!view) notFound();
  return <TimesPage view={view} token={token} wasTaken={taken !== undefined} />;
}

import type { Metadata } from 'next';
import { KeptPage } from '@/components/phone/kept-page';

export const metadata: Metadata = { title: 'No signal', robots: { index: false } };
export const dynamic = 'force-static';

/** The same for everybody: it knows nobody, and shows what the phone keeps. The worker answers with it. */
export default function NoSignalPage() {
  return <KeptPage />;
}

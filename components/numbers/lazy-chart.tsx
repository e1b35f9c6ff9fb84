'use client';

import dynamic from 'next/dynamic';
import type { Figure } from '@/lib/contracts/numbers';

/** The drawing library comes after the figures: they can be read without it. */
const SplitChart = dynamic(() => import('./split-chart').then((part) => part.SplitChart), {
  ssr: false,
});

export function LazyChart({ splits }: { splits: Figure['splits'] }) {
  return <SplitChart splits={splits} />;
}

'use client';

import { useRouter } from 'next/navigation';
import { useEffect } from 'react';
import type { LiveTopic } from '@/lib/contracts/live';
import { hearLive } from './live-source';

const gatherMs = 400;

/** For a page that the server draws: drawn again when one of its topics changed; what is half typed stays. */
export function LiveRefresh({ topics }: { topics: readonly LiveTopic[] }) {
  const router = useRouter();
  const wanted = topics.join(' ');
  useEffect(() => {
    let timer: ReturnType<typeof setTimeout> | undefined;
    const end = hearLive((news) => {
      if (news !== 'all' && !wanted.split(' ').includes(news)) return;
      clearTimeout(timer);
      timer = setTimeout(() => router.refresh(), gatherMs);
    });
    return () => {
      clearTimeout(timer);
      end();
    };
  }, [router, wanted]);
  return null;
}

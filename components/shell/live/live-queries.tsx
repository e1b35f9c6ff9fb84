'use client';

import { useQueryClient } from '@tanstack/react-query';
import { useEffect } from 'react';
import type { LiveTopic } from '@/lib/contracts/live';
import { hearLive } from './live-source';

/** By topic, the first parts of the query keys that hold something of it; pages of the server use LiveRefresh. */
const keysOf: Record<LiveTopic, readonly string[]> = {
  visits: ['visits', 'waiting', 'openings', 'days'],
  readings: [],
  messages: ['messages'],
  releases: ['waiting', 'openings'],
  jobs: ['waiting', 'openings', 'job-search'],
  crews: ['crews', 'openings', 'days'],
  site: ['days'],
};

/** What another person changed is fetched again at once, where it is on the screen. */
export function LiveQueries() {
  const client = useQueryClient();
  useEffect(
    () =>
      hearLive((news) => {
        if (news === 'all') {
          void client.invalidateQueries();
          return;
        }
        for (const key of keysOf[news]) void client.invalidateQueries({ queryKey: [key] });
      }),
    [client],
  );
  return null;
}

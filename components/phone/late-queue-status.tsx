'use client';

import dynamic from 'next/dynamic';

/** For what every phone page brings along unseen, the 404 and the error page: fetched when one is shown. */
export const LateQueueStatus = dynamic(
  () => import('./queue-status').then((module) => module.QueueStatus),
  { ssr: false },
);

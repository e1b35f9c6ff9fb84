'use client';

import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { type ReactNode, useState } from 'react';
import { RequestProblem } from '@/components/shell/ask-server';
import { LiveQueries } from '@/components/shell/live/live-queries';

/** For the office screens only: the front, the phone and the customer's page do without it. */
export function Providers({ children }: { children: ReactNode }) {
  const [client] = useState(makeClient);
  return (
    <QueryClientProvider client={client}>
      <LiveQueries />
      {children}
    </QueryClientProvider>
  );
}

function makeClient() {
  return new QueryClient({
    defaultOptions: {
      queries: {
        staleTime: 15_000,
        // A refusal stays a refusal; only no answer and a server's own fault are asked again.
        retry: (failures, cause) =>
          failures < 2 &&
          (!(cause instanceof RequestProblem) ||
            cause.problem.status === 0 ||
            cause.problem.status >= 500),
      },
    },
  });
}

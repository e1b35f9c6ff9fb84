'use client';

import { Button } from '@/components/ui/button';
import { ErrorState } from '@/components/ui/error-state';

type ErrorPageProps = { error: Error & { digest?: string }; reset: () => void };

export default function ErrorPage({ error, reset }: ErrorPageProps) {
  return (
    <div className="p-4 md:p-6">
      <ErrorState
        title="This page could not be drawn"
        action={<Button onClick={reset}>Try again</Button>}
      >
        <p>What was saved before is saved; only the showing of it failed.</p>
        {error.digest ? (
          <p className="text-note text-graphite">If you ask for help, say {error.digest}.</p>
        ) : null}
      </ErrorState>
    </div>
  );
}

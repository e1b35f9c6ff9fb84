import { Button } from '@/components/ui/button';
import { TitleBlock } from '@/components/ui/title-block';

export type PageErrorProps = { error: Error & { digest?: string }; reset: () => void };

/** In place of a page that failed: what is safe, and the way to try again. */
export function PageError({ error, reset }: PageErrorProps) {
  return (
    <div role="alert" className="max-w-prose">
      <TitleBlock
        level={1}
        title="This page could not be drawn"
        meta={error.digest ? `if you ask for help: ${error.digest}` : undefined}
      />
      <p className="py-4">What was saved before is saved; only the showing of it failed.</p>
      <Button onClick={reset}>Try again</Button>
    </div>
  );
}

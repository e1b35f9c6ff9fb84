'use client';

import './globals.css';
import ErrorPage from './error';

type GlobalErrorProps = { error: Error & { digest?: string }; reset: () => void };

/** Stands in for the whole document when even its frame failed. */
export default function GlobalError(props: GlobalErrorProps) {
  return (
    <html lang="en">
      <body>
        <title>Something went wrong · Setwell</title>
        <ErrorPage {...props} />
      </body>
    </html>
  );
}

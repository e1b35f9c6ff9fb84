'use client';

import type { PageErrorProps } from '@/components/shell/page-error';
import ErrorPage from './error';
import './globals.css';

/** Stands in for the whole document when even its frame failed. */
export default function GlobalError(props: PageErrorProps) {
  return (
    <html lang="en">
      <body>
        <title>Something went wrong · Setwell</title>
        <ErrorPage {...props} />
      </body>
    </html>
  );
}

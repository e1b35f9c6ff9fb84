'use client';

import { Mark } from '@/components/shell/mark';
import { PageError, type PageErrorProps } from '@/components/shell/page-error';
import { paths } from '@/lib/paths';

/**
 * In place of any page that failed. Every page brings it along, so it is light: no drawing, and a plain
 * link, which also loads everything afresh.
 */
export default function ErrorPage(props: PageErrorProps) {
  return (
    <div className="mx-auto flex min-h-dvh max-w-page flex-col px-4 md:px-8">
      <header className="border-b border-ink pt-5 pb-2">
        <a
          href={paths.front()}
          className="inline-flex items-center gap-1.5 text-lead font-bold tracking-tight"
        >
          <Mark />
          Setwell
        </a>
      </header>
      <main className="max-w-form flex-1 py-6 md:py-10">
        <PageError {...props} />
      </main>
    </div>
  );
}

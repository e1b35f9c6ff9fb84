'use client';

import { PageError, type PageErrorProps } from '@/components/shell/page-error';
import { PlainPage } from '@/components/shell/plain-page';

export default function ErrorPage(props: PageErrorProps) {
  return (
    <PlainPage width="form">
      <PageError {...props} />
    </PlainPage>
  );
}

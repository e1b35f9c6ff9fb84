import type { Metadata } from 'next';
import { PlainPage } from '@/components/shell/plain-page';
import { LinkButton } from '@/components/ui/link-button';
import { TitleBlock } from '@/components/ui/title-block';
import { paths } from '@/lib/paths';

export const metadata: Metadata = { title: 'Nothing here' };

export default function NotFound() {
  return (
    <PlainPage width="form">
      <TitleBlock level={1} title="Nothing at this address" meta="404" />
      <p className="py-4">
        It was moved, called off, or belongs to another shop. Nothing of yours is lost: go back, or
        start again from the front.
      </p>
      <LinkButton href={paths.front()}>To the front</LinkButton>
    </PlainPage>
  );
}

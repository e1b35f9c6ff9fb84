import type { Metadata } from 'next';
import { NothingHere } from '@/components/shell/nothing-here';
import { PlainPage } from '@/components/shell/plain-page';
import { paths } from '@/lib/paths';

export const metadata: Metadata = { title: 'Nothing here' };

export default function NotFound() {
  return (
    <PlainPage width="form">
      <NothingHere href={paths.front()} word="To the front" />
    </PlainPage>
  );
}

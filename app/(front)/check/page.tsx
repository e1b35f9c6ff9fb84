import type { Metadata } from 'next';
import { CornerForm } from '@/components/front/corner-form';
import { PlainPage } from '@/components/shell/plain-page';
import { TitleBlock } from '@/components/ui/title-block';

export const metadata: Metadata = {
  title: 'Check a corner, check a wall, get the filler',
  description:
    'Three readings of a corner, seven gaps to a straightedge: what they mean for a cabinet.',
};

export default function CheckPage() {
  return (
    <PlainPage>
      <TitleBlock level={1} title="Checks" meta="nothing is sent or kept" className="mb-8" />
      <CornerForm />
    </PlainPage>
  );
}

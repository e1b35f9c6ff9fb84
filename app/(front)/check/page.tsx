import type { Metadata } from 'next';
import { CornerForm } from '@/components/front/corner-form';
import { FillerForm } from '@/components/front/filler-form';
import { WallForm } from '@/components/front/wall-form';
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
      <TitleBlock level={1} title="Checks" meta="nothing is sent or kept" className="mb-6" />
      <div className="flex flex-col gap-10 border border-ink bg-sheet px-4 py-4 md:px-6">
        <CornerForm />
        <WallForm />
        <FillerForm />
      </div>
      <p className="max-w-prose pt-6 text-note text-graphite">
        Reckoned with a class II tape, a level true to 0.5 mm a metre, and common practice for the
        limits. In a shop of your own you say what is in the van and which rules you build to, and
        every reading is kept with the wall it belongs to.
      </p>
    </PlainPage>
  );
}

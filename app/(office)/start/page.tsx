import type { Metadata } from 'next';
import { SamplePart } from '@/components/start/sample-part';
import { StartSteps } from '@/components/start/start-steps';
import { TitleBlock } from '@/components/ui/title-block';
import { pageContext } from '@/server/base/page-context';
import { getStart } from '@/server/numbers/get-start';

export const metadata: Metadata = { title: 'Start' };

export default async function StartPage() {
  const ctx = await pageContext('shop:change');
  const { done, isSample, sampleShopId } = await getStart(ctx);
  const left = Object.values(done).filter((isDone) => !isDone).length;
  return (
    <>
      <TitleBlock level={1} title="Start" meta={left === 0 ? 'all done' : `${left} of 6 to go`} />
      <div className="mt-4 grid gap-x-10 gap-y-8 lg:grid-cols-[minmax(0,3fr)_minmax(0,2fr)]">
        <StartSteps done={done} />
        <SamplePart isSample={isSample} sampleShopId={sampleShopId} />
      </div>
    </>
  );
}

import type { Metadata } from 'next';
import { LiveRefresh } from '@/components/shell/live/live-refresh';
import { SamplePart } from '@/components/start/sample-part';
import { StartSteps } from '@/components/start/start-steps';
import { TitleBlock } from '@/components/ui/title-block';
import { laterSteps, startSteps } from '@/lib/contracts/start';
import { phoneWords } from '@/lib/messages/phone-number';
import { pageContext } from '@/server/base/page-context';
import { getStart } from '@/server/numbers/get-start';
import { getShopRules } from '@/server/shops/get-shop-rules';
import { getCrews } from '@/server/visits/get-crews';

export const metadata: Metadata = { title: 'Start' };

export default async function StartPage() {
  const ctx = await pageContext('shop:change');
  const start = await getStart(ctx);
  const rules = await getShopRules(ctx);
  const { personId, name } = ctx.actor;
  const left = startSteps.filter((step) => !start.done[step] && !laterSteps.includes(step)).length;
  return (
    <>
      <TitleBlock
        level={1}
        title="Start"
        meta={
          left === 0 ? 'a first visit stands confirmed' : `${left} to the first confirmed visit`
        }
      />
      <LiveRefresh topics={['visits']} />
      <div className="mt-4 grid gap-x-10 gap-y-8 lg:grid-cols-[minmax(0,3fr)_minmax(0,2fr)]">
        <StartSteps
          start={start}
          settings={{ ...rules, phone: phoneWords(rules.phone, rules.region) }}
          crews={await getCrews(ctx)}
          person={{ personId, name }}
        />
        <SamplePart isSample={start.isSample} sampleShopId={start.sampleShopId} />
      </div>
    </>
  );
}

import type { Metadata } from 'next';
import Link from 'next/link';
import { FigureDetail } from '@/components/numbers/figure-detail';
import { FigureList } from '@/components/numbers/figure-list';
import { OwnTimes } from '@/components/numbers/own-times';
import { TitleBlock } from '@/components/ui/title-block';
import { figureKeys, numbersInput } from '@/lib/contracts/numbers';
import { paths } from '@/lib/paths';
import { pageContext } from '@/server/base/page-context';
import { getDurationCorrections } from '@/server/days/get-duration-corrections';
import { getNumbers } from '@/server/numbers/get-numbers';
import { getShopRules } from '@/server/shops/get-shop-rules';

export const metadata: Metadata = { title: 'Numbers' };

const periods = [30, 90, 365];

type NumbersPageProps = { searchParams: Promise<{ days?: string; figure?: string }> };

export default async function NumbersPage({ searchParams }: NumbersPageProps) {
  const ctx = await pageContext('numbers:read');
  const asked = await searchParams;
  const input = numbersInput.safeParse({ days: asked.days });
  const { days } = input.success ? input.data : numbersInput.parse({});
  const shown = figureKeys.find((key) => key === asked.figure) ?? figureKeys[0];
  const numbers = await getNumbers(ctx, { days });
  const figure = numbers.figures.find(({ key }) => key === shown);
  return (
    <>
      <TitleBlock
        level={1}
        title="Numbers"
        meta={
          <nav aria-label="Period" className="flex flex-wrap gap-x-4 whitespace-nowrap">
            <span>
              {numbers.from} to {numbers.until}
            </span>
            {periods.map((period) => (
              <Link
                key={period}
                href={paths.numbersOf(shown, period)}
                aria-current={period === days ? 'true' : undefined}
                className={period === days ? 'font-bold text-ink' : 'link'}
              >
                {period} days
              </Link>
            ))}
          </nav>
        }
      />
      <div className="mt-4 grid gap-x-10 gap-y-6 lg:grid-cols-[22rem_minmax(0,1fr)]">
        <FigureList numbers={numbers} days={days} shown={shown} />
        {figure ? (
          <FigureDetail figure={figure} currency={numbers.currency} days={days}>
            {shown === 'hours' ? (
              <OwnTimes
                times={await getDurationCorrections(ctx)}
                settings={await getShopRules(ctx)}
              />
            ) : null}
          </FigureDetail>
        ) : null}
      </div>
    </>
  );
}

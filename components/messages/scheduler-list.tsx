'use client';

import Link from 'next/link';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { sayProblem } from '@/components/shell/say-problem';
import { Button } from '@/components/ui/button';
import { TitleBlock } from '@/components/ui/title-block';
import { Verdict, type VerdictKind } from '@/components/ui/verdict';
import type { SchedulerItemKind, SchedulerItemView } from '@/lib/contracts/messages';
import { paths } from '@/lib/paths';
import { tickOffItem } from './messages-query';

const kinds: Record<SchedulerItemKind, { words: string; kind: VerdictKind }> = {
  'unclear-reply': { words: 'not clear', kind: 'waiting' },
  'asks-other-time': { words: 'another time', kind: 'waiting' },
  'call-me': { words: 'call them', kind: 'problem' },
  'not-ready': { words: 'not ready', kind: 'problem' },
  'time-taken': { words: 'moved it', kind: 'confirmed' },
  'no-answer': { words: 'no answer', kind: 'waiting' },
  'not-delivered': { words: 'not delivered', kind: 'problem' },
  'said-stop': { words: 'no more texts', kind: 'problem' },
  'running-late': { words: 'running late', kind: 'late' },
  'nobody-home': { words: 'nobody home', kind: 'problem' },
  'cabinets-late': { words: 'cabinets late', kind: 'late' },
};

/** What somebody of the office has to answer, the longest waiting first; gone when it is seen to. */
export function SchedulerList({
  items,
  maySettle,
}: {
  items: SchedulerItemView[];
  maySettle: boolean;
}) {
  const router = useRouter();
  const [leaving, setLeaving] = useState<ReadonlySet<string>>(new Set());
  const shown = items.filter(({ id }) => !leaving.has(id));

  async function tickOff(id: string) {
    setLeaving((before) => new Set(before).add(id));
    try {
      await tickOffItem(id);
      router.refresh();
    } catch (caught) {
      setLeaving((before) => new Set([...before].filter((other) => other !== id)));
      sayProblem(caught);
    }
  }

  return (
    <section aria-labelledby="to-answer" className="mb-8">
      <TitleBlock id="to-answer" title="To answer" meta={shown.length} />
      {shown.length === 0 ? (
        <p className="py-3 text-graphite">
          Nothing. What is not clear, not delivered or asked for by a customer comes here.
        </p>
      ) : (
        <ul>
          {shown.map((item) => (
            <li
              key={item.id}
              className="grid grid-cols-[minmax(0,1fr)_auto] items-center gap-x-4 gap-y-1 border-b border-rule py-2 sm:grid-cols-[9rem_12rem_minmax(0,1fr)_auto]"
            >
              <Verdict kind={kinds[item.kind].kind}>{kinds[item.kind].words}</Verdict>
              <span className="text-note text-graphite max-sm:text-right">{item.atWords}</span>
              <p className="min-w-0 max-sm:col-span-2">
                <Link href={paths.thread(item.customerId)} className="font-bold hover:underline">
                  {item.customerName}
                </Link>{' '}
                <span className="text-note text-graphite">{item.phone}</span>
                <span className="block break-words">{item.words}</span>
              </p>
              {maySettle ? (
                <Button look="line" className="max-sm:col-span-2" onClick={() => tickOff(item.id)}>
                  Seen to<span className="sr-only">: {item.customerName}</span>
                </Button>
              ) : null}
            </li>
          ))}
        </ul>
      )}
    </section>
  );
}

import Link from 'next/link';
import { Button } from '@/components/ui/button';
import { KeyHint } from '@/components/ui/key-hint';
import type { WaitingItem } from '@/lib/contracts/visits';
import { paths } from '@/lib/paths';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { KindMark } from './kind-mark';
import { minutesWords } from './visit-words';

const stateLooks = { now: 'text-moss', from: 'text-ink', blocked: 'text-ochre' } as const;

export function WaitingLine({
  item,
  number,
  mayBook,
  onTimes,
}: {
  item: WaitingItem;
  /** The digit key that opens it; the first nine have one. */
  number: number | null;
  mayBook: boolean;
  onTimes: () => void;
}) {
  const title = `${visitKindWords[item.kind]} · ${item.customerName}, ${item.street}`;
  return (
    <li
      data-waiting={`${item.jobId}/${item.kind}`}
      data-title={title}
      data-minutes={item.workMinutes}
      className={`border-b border-rule py-2.5 ${mayBook ? 'cursor-grab' : ''}`}
    >
      <div className="flex items-baseline justify-between gap-2">
        <Link href={paths.job(item.jobId)} className="font-bold hover:underline" draggable={false}>
          <KindMark kind={item.kind} isNamed /> {title}
        </Link>
        {number && mayBook ? <KeyHint keys={String(number)} /> : null}
      </div>
      <p className={`text-note ${stateLooks[item.state]}`}>{item.why}</p>
      {item.wish ? <p className="text-note text-ochre">“{item.wish}”</p> : null}
      <div className="flex items-baseline justify-between gap-2">
        <span className="text-note text-graphite">
          {item.jobTitle} · {minutesWords(item.workMinutes)}
        </span>
        {mayBook ? (
          <Button
            look="plain"
            className="shrink-0 max-lg:min-h-key"
            onClick={onTimes}
            aria-label={`Times that work: ${title}`}
          >
            Times
          </Button>
        ) : null}
      </div>
    </li>
  );
}

import { Verdict } from '@/components/ui/verdict';
import type { CrewSnag } from '@/lib/contracts/snags';
import { useCrew } from './crew-language';
import { stopHref } from './stop-place';

/** How much is to be mended on all jobs, one tap from the day; nothing where nothing is. */
export function MendLine({ snags }: { snags: readonly CrewSnag[] }) {
  const { words, language } = useCrew();
  if (snags.length === 0) return null;
  const late = snags.filter(({ isLate }) => isLate).length;
  const said = words.toMendOf(snags.length, late);
  return (
    <a
      lang={language}
      href={stopHref({ at: 'snags' })}
      className="mx-3.5 flex min-h-thumb touch-manipulation items-center justify-between gap-3 border-y border-rule text-lead active:bg-tint"
    >
      <span className="font-bold">{words.toMend}</span>
      <span className="flex items-center gap-2">
        {late > 0 ? <Verdict kind="late">{said}</Verdict> : said}
        <span aria-hidden="true">›</span>
      </span>
    </a>
  );
}

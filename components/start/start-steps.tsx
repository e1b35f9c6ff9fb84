import Link from 'next/link';
import { Glyph } from '@/components/ui/glyph';
import type { StartStep, StartView } from '@/lib/contracts/start';
import { startSteps } from '@/lib/contracts/start';
import { paths } from '@/lib/paths';

const steps: Record<StartStep, { title: string; words: string; href: string }> = {
  rules: {
    title: 'Look over the shop rules',
    words: 'Units, hours, the arrival window, least fillers. They start from common practice.',
    href: paths.rules(),
  },
  crew: {
    title: 'Make a crew',
    words: 'Who goes out together: a measurer alone is a crew too.',
    href: paths.crews(),
  },
  people: {
    title: 'Invite your people',
    words: 'They get a link by e-mail; what each may do goes by their role.',
    href: paths.crews(),
  },
  job: {
    title: 'Start the first job',
    words: 'Customer, site and what they want made. Many at once come from a CSV file.',
    href: paths.newJob(),
  },
  visit: {
    title: 'Book its site measure',
    words: 'Drag it from the waiting list into the diary, or ask for times that work.',
    href: paths.diary(),
  },
  yes: {
    title: 'Wait for the yes',
    words: 'The customer gets a text and an e-mail, and confirms from the link.',
    href: paths.messages(),
  },
};

/** From nothing to a confirmed visit: what is done is ticked, what comes next stands out. */
export function StartSteps({ done }: Pick<StartView, 'done'>) {
  const next = startSteps.find((step) => !done[step]);
  return (
    <ol className="border-t border-rule">
      {startSteps.map((step, place) => {
        const { title, words, href } = steps[step];
        return (
          <li key={step} className="grid grid-cols-[2rem_1fr] border-b border-rule py-3">
            <span className="text-lead font-bold tabular-nums">
              {done[step] ? <Glyph name="within" /> : place + 1}
            </span>
            <div>
              <Link
                href={href}
                className={step === next ? 'link text-lead font-bold' : 'font-bold hover:underline'}
              >
                {title}
              </Link>
              {done[step] ? <span className="ml-2 text-moss">done</span> : null}
              <p className="text-graphite">{words}</p>
            </div>
          </li>
        );
      })}
    </ol>
  );
}

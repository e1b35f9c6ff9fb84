import { Button } from '@/components/ui/button';
import type { CustomerTimesView } from '@/lib/contracts/visits';
import { paths } from '@/lib/paths';
import { customerWords, unbroken } from './customer-words';
import { HoldLeft } from './hold-left';

type Props = {
  hold: NonNullable<CustomerTimesView['hold']>;
  language: CustomerTimesView['language'];
  token: string;
};

/** The time that is kept: until when, and how long that still is where scripts run. */
export function HeldTime({ hold, language, token }: Props) {
  const words = customerWords(language);
  return (
    <section className="mt-4 border-2 border-pine px-4 py-3" aria-labelledby="kept">
      <h2 id="kept" className="font-bold">
        {words.kept}{' '}
        <HoldLeft
          holdEndsAt={hold.holdEndsAt}
          language={language}
          until={words.keptUntil(hold.untilWords)}
        />
      </h2>
      <p className="mt-1 text-lead">
        <span className="block font-bold first-letter:uppercase">{hold.dayWords}</span>
        {unbroken(hold.windowWords)}
      </p>
      <form method="post" action={paths.customerTake(token)} className="mt-3">
        <input type="hidden" name="heldVisitId" value={hold.heldVisitId} />
        <Button type="submit" size="thumb">
          {words.take}
        </Button>
      </form>
    </section>
  );
}

import type { CrewSnag } from '@/lib/contracts/snags';
import { useCrew } from './crew-language';
import { dayWords } from './snag-facts';

/** Whose snag it is, where, and when the crew is there next. */
export function MendWhere({ snag }: { snag: CrewSnag }) {
  const crew = useCrew();
  const { words } = crew;
  const address = [snag.street, snag.town].filter(Boolean).join(', ');
  return (
    <span className="block">
      <span className="block font-medium">
        {snag.customerName}, {address}
      </span>
      <span className="block text-graphite">
        {snag.nextOn ? words.thereOn(dayWords(snag.nextOn, crew)) : words.noVisitThere}
      </span>
    </span>
  );
}

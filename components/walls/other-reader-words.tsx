import { Verdict } from '@/components/ui/verdict';
import type { OtherReader } from '@/lib/walls-pad/other-readers';
import { FractionWords } from './fraction-words';

/** What other people read of the same thing, each with the difference from this reading. */
export function OtherReaderWords({ others }: { others: OtherReader[] }) {
  return others.map(({ readingId, name, value, difference, isApart }) => (
    <span key={readingId} className="block text-note text-graphite">
      {name} read <FractionWords>{value}</FractionWords>{' '}
      <Verdict kind={isApart ? 'over' : 'within'}>
        <FractionWords>{difference}</FractionWords>
      </Verdict>
    </span>
  ));
}

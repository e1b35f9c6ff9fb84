import { Button } from '@/components/ui/button';
import { EmptyState } from '@/components/ui/empty-state';
import { ErrorState } from '@/components/ui/error-state';
import { Skeleton, SkeletonScreen } from '@/components/ui/skeleton';
import type { Opening, OpeningsView } from '@/lib/contracts/openings';
import type { CrewView } from '@/lib/contracts/visits';
import { OpeningLine } from './opening-line';

type OpeningsListProps = {
  data: OpeningsView | undefined;
  error: unknown;
  isPending: boolean;
  crews: readonly CrewView[];
  chosen: number;
  onChoose: (index: number) => void;
  onBook: (opening: Opening) => void;
  /** Shows days before the gates allow them; null once they are shown. */
  onOverride: (() => void) | null;
};

export function OpeningsList(props: OpeningsListProps) {
  const { data, error, isPending, crews, chosen, onOverride } = props;
  if (error) {
    return (
      <ErrorState title="The times could not be fetched">
        Book by hand, or close and open this again.
      </ErrorState>
    );
  }
  if (isPending || !data) {
    return (
      <SkeletonScreen what="times that work">
        {[1, 2, 3, 4].map((line) => (
          <Skeleton key={line} className="mt-2 h-16 w-full" />
        ))}
      </SkeletonScreen>
    );
  }
  const override =
    onOverride && data.state !== 'now' ? (
      <Button look="plain" onClick={onOverride}>
        {data.state === 'blocked' ? 'Book it all the same' : 'Show earlier days all the same'}
      </Button>
    ) : null;
  if (data.openings.length === 0) {
    return (
      <EmptyState title="No time works" action={override}>
        {data.whyNone}
      </EmptyState>
    );
  }
  return (
    <div className="min-h-0 flex-1 overflow-y-auto py-2 max-lg:overflow-visible" data-openings>
      <ol className="flex flex-col gap-1.5 p-0.5">
        {data.openings.map((opening, index) => (
          <OpeningLine
            key={`${opening.crewId}-${opening.startsAt}`}
            opening={opening}
            number={index + 1}
            crew={crews.find(({ id }) => id === opening.crewId)}
            isChosen={index === Math.min(chosen, data.openings.length - 1)}
            onChoose={() => props.onChoose(index)}
            onBook={() => props.onBook(opening)}
          />
        ))}
      </ol>
      <p className="pt-1 text-note text-graphite">
        {data.found > data.openings.length
          ? `The best ${data.openings.length} of ${data.found}. A wish or a later first day shows others.`
          : 'These are all.'}
        {override}
      </p>
    </div>
  );
}

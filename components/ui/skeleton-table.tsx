import { Skeleton, SkeletonScreen } from './skeleton';

const widths = ['w-3/4', 'w-2/3', 'w-5/6', 'w-1/2', 'w-3/5'];

/** A headed table, waiting for its rows. */
export function SkeletonTable({ what, rows = 8 }: { what: string; rows?: number }) {
  return (
    <SkeletonScreen what={what}>
      <div className="border-b border-ink pb-2">
        <Skeleton className="h-7 w-48" />
      </div>
      {Array.from({ length: rows }, (_, row) => row).map((row) => (
        <div key={`row ${row}`} className="grid grid-cols-4 gap-6 border-b border-rule py-2.5">
          {[0, 1, 2, 3].map((column) => (
            <Skeleton key={column} className={`h-4 ${widths[(row + column) % widths.length]}`} />
          ))}
        </div>
      ))}
    </SkeletonScreen>
  );
}

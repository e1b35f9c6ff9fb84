import Link from 'next/link';
import type { VisitOutside } from '@/lib/contracts/crews';
import { paths } from '@/lib/paths';

/** Visits that stand where their crew does not work, each with why and the way to it. */
export function OutsideList({ visits }: { visits: readonly VisitOutside[] }) {
  return (
    <ul>
      {visits.map((visit) => (
        <li
          key={visit.visitId}
          className="flex flex-wrap items-baseline gap-x-3 border-b border-rule py-1.5"
        >
          <Link href={paths.diaryOn(visit.date)} className="font-bold hover:underline">
            {visit.words}
          </Link>
          <span>
            {visit.customerName}, job {visit.jobNumber}, {visit.crewName}
          </span>
          <span className="ml-auto text-chalk">{visit.why}</span>
        </li>
      ))}
    </ul>
  );
}

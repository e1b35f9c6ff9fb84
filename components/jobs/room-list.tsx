import Link from 'next/link';
import { EmptyState } from '@/components/ui/empty-state';
import { Verdict } from '@/components/ui/verdict';
import type { RoomRow } from '@/lib/contracts/jobs';
import { paths } from '@/lib/paths';

/** The rooms of a job: how far each wall book is, and which revision the bench has. */
export function RoomList({ jobId, rooms }: { jobId: string; rooms: RoomRow[] }) {
  if (rooms.length === 0) {
    return (
      <EmptyState title="No room drawn yet">
        The measurer draws it on the phone at the site measure; it appears here as it is read.
      </EmptyState>
    );
  }
  return (
    <ul>
      {rooms.map((room) => (
        <li
          key={room.id}
          className="flex flex-wrap items-baseline justify-between gap-x-6 border-b border-rule py-2"
        >
          <Link href={paths.room(jobId, room.id)} className="font-bold hover:underline">
            {room.name}
          </Link>
          <span className="text-graphite">
            {room.wallCount} walls, {room.readingCount} readings, {room.runCount} runs
          </span>
          {room.revision ? (
            <span className="flex gap-3">
              <Link href={paths.sheet(jobId, room.id, room.revision)} className="underline">
                shop sheet, revision {room.revision}
              </Link>
              {room.isSuperseded ? <Verdict kind="over">superseded</Verdict> : null}
            </span>
          ) : (
            <Verdict kind="waiting">
              {room.submittedAt ? 'read, not released' : 'being measured'}
            </Verdict>
          )}
        </li>
      ))}
    </ul>
  );
}

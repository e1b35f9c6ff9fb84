import Link from 'next/link';
import { Verdict } from '@/components/ui/verdict';
import type { ReleaseRow } from '@/lib/contracts/rooms';
import { paths } from '@/lib/paths';

/** The revisions of a room, newest first; what is superseded says so in red. */
export function RevisionList({
  jobId,
  roomId,
  releases,
}: {
  jobId: string;
  roomId: string;
  releases: ReleaseRow[];
}) {
  if (releases.length === 0) return <p className="py-2 text-graphite">Nothing is released yet.</p>;
  return (
    <ul>
      {releases.map((release) => (
        <li
          key={release.id}
          className="flex flex-wrap items-baseline gap-x-3 border-b border-rule py-1.5"
        >
          <Link href={paths.sheet(jobId, roomId, release.revision)} className="link font-bold">
            Revision {release.revision}
          </Link>
          <span className="text-note text-graphite">
            {release.releasedAtWords}, {release.releasedBy}
          </span>
          {release.isSuperseded ? (
            <Verdict kind="over">superseded</Verdict>
          ) : (
            <Verdict kind={release.takenUpWords ? 'confirmed' : 'waiting'}>
              {release.takenUpWords ? `taken up: ${release.takenUpWords}` : 'not taken up yet'}
            </Verdict>
          )}
        </li>
      ))}
    </ul>
  );
}

import { PhotoImage } from '@/components/photos/photo-image';
import { Verdict } from '@/components/ui/verdict';
import type { SnagView } from '@/lib/contracts/snags';
import { apiPaths } from '@/lib/paths';
import { crewEn } from '@/lib/words/crew-en';

/** A snag in the office: its words, where, who found it, its photos, and what the bench says. */
export function SnagFacts({ snag }: { snag: SnagView }) {
  const where = [crewEn.snagKinds[snag.kind], snag.roomName, snag.place]
    .filter(Boolean)
    .join(' · ');
  const photoIds = [...snag.photoIds, ...snag.closedPhotoIds];
  return (
    <div className="flex flex-col gap-0.5">
      <span className="font-medium">{snag.words}</span>
      <span className="text-note text-graphite">{where}</span>
      <span className="text-note text-graphite">found by {snag.foundWords}</span>
      {snag.isAfterSignOff ? (
        <span className="text-note text-ochre">found after the customer signed: stands apart</span>
      ) : null}
      {snag.benchSays ? (
        <span className="text-note">
          Bench: {snag.benchSays}
          {snag.benchReadyOn ? `, ready ${snag.benchReadyOn}` : ''}
        </span>
      ) : null}
      {snag.closedAt ? (
        <Verdict kind="confirmed">
          closed by {snag.closedBy}
          {snag.closedWords ? `: ${snag.closedWords}` : ''}
        </Verdict>
      ) : null}
      {photoIds.length > 0 ? (
        <span className="flex flex-wrap gap-2 pt-1">
          {photoIds.map((photoId) => (
            <a
              key={photoId}
              href={apiPaths.file(photoId)}
              target="_blank"
              rel="noreferrer"
              className="block size-14 overflow-hidden rounded border border-rule bg-tint"
            >
              <PhotoImage src={apiPaths.file(photoId)} words={`Photo: ${snag.words}`} />
            </a>
          ))}
        </span>
      ) : null}
    </div>
  );
}

import type { JobView } from '@/lib/contracts/jobs';

/** What happened, newest first, and who did it. */
export function JobStory({ story }: { story: JobView['story'] }) {
  return (
    <ol className="py-2">
      {story.map((line) => (
        <li
          key={line.id}
          className="grid grid-cols-[minmax(7rem,11rem)_1fr] gap-4 border-b border-rule py-1.5"
        >
          <time dateTime={line.at} className="text-note text-graphite">
            {line.atWords}
          </time>
          <span>
            {line.summary} <span className="text-note text-graphite">{line.who}</span>
          </span>
        </li>
      ))}
    </ol>
  );
}

import { InFractions } from '@/components/fit/in-fractions';
import { Glyph } from '@/components/ui/glyph';

type SupersededBandProps = {
  revision: string;
  newerRevision: string | null;
  newerHref: string | null;
  supersededBy: string[];
};

/**
 * Across every leaf, in red, on screen and on paper: this sheet no longer holds, and why. On paper in one line,
 * so that no leaf runs over its page.
 */
export function SupersededBand({
  revision,
  newerRevision,
  newerHref,
  supersededBy,
}: SupersededBandProps) {
  if (!newerRevision && supersededBy.length === 0) return null;
  return (
    <div
      role="alert"
      className="superseded-band mb-3 border-2 border-chalk bg-chalk px-3 py-2 text-on-fill print:mb-1.5 print:flex print:items-baseline print:gap-4 print:py-0.5"
    >
      <p className="text-lead font-bold">
        <Glyph name="over" className="mr-2" />
        Superseded. Do not cut from revision {revision}.
      </p>
      <p>
        {newerRevision ? (
          <>
            Revision {newerRevision} is in force.{' '}
            {newerHref ? (
              <a href={newerHref} className="underline print:hidden">
                Open it
              </a>
            ) : null}
          </>
        ) : (
          'The room has changed since it was released, and no newer revision is out yet.'
        )}
      </p>
      {supersededBy.length > 0 ? (
        <ul className="list-disc pl-5 print:hidden">
          {supersededBy.slice(0, 6).map((words) => (
            <li key={words}>
              <InFractions words={words} />
            </li>
          ))}
          {supersededBy.length > 6 ? <li>and {supersededBy.length - 6} more</li> : null}
        </ul>
      ) : null}
    </div>
  );
}

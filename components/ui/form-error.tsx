import type { ProblemDetails } from '@/lib/problem-details';
import { Glyph } from './glyph';

/**
 * Above the form's button: what happened, what was kept, what to do. Errors of fields that the form
 * does not show are listed here, so that none is lost.
 */
export function FormError({
  problem,
  shownFields = [],
}: {
  problem: ProblemDetails | null | undefined;
  shownFields?: string[];
}) {
  if (!problem) return null;
  const others = Object.entries(problem.errors ?? {}).filter(
    ([path]) => !shownFields.includes(path),
  );
  return (
    <div role="alert" className="border-l-4 border-chalk bg-tint px-3 py-2">
      <p className="font-bold text-chalk">
        <Glyph name="problem" className="-ml-[0.3em] mr-[0.1em]" />
        {problem.title}
      </p>
      {problem.detail ? <p>{problem.detail}</p> : null}
      {others.length > 0 ? (
        <ul className="list-disc pl-5">
          {others.map(([path, text]) => (
            <li key={path}>{text}</li>
          ))}
        </ul>
      ) : null}
    </div>
  );
}

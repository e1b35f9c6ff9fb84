import type { VisitKind } from '@/lib/schedule/visit-kind';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';

/** Our own marks for the kinds of visit: a rule, a rule with a tick, a van, boxes in a row, a slab, a bend back. */
const marks: Record<VisitKind, React.ReactNode> = {
  'site-measure': <path d="M1 4.5h14v6H1zM4 4.5v2.5M7 4.5v3.5M10 4.5v2.5M13 4.5v3.5" />,
  'check-measure': <path d="M1 6.5h9v5H1zM3.5 6.5v2M6 6.5v2.8M10.5 4.5l1.8 2L15.4 2" />,
  delivery: <path d="M1 3.5h8.5v8H1zM9.5 6h3l2.5 2.5v3H9.5M4 11.5v1.5M12 11.5v1.5" />,
  install: <path d="M1 2.5h4.6v4.4H1zM1 9h4.6v4.5H1zM5.6 9h4.6v4.5H5.6zM10.2 9h4.6v4.5h-4.6z" />,
  'worktop-template': <path d="M1 5.5h14v3.4H6.4v4.6H1z" />,
  return: <path d="M3 11.5h7.2a3.6 3.6 0 0 0 0-7.2H3.4M6 1.6 3.2 4.3 6 7" />,
};

/** Small, drawn in the crew's colour; the kind's name is beside it or read out in its place. */
export function KindMark({ kind, isNamed = false }: { kind: VisitKind; isNamed?: boolean }) {
  return (
    <svg
      viewBox="0 0 16 16"
      width="1.15em"
      height="1.15em"
      fill="none"
      stroke="currentColor"
      strokeWidth="1.4"
      strokeLinejoin="round"
      strokeLinecap="round"
      className="inline-block shrink-0 align-[-0.2em]"
      role={isNamed ? undefined : 'img'}
      aria-label={isNamed ? undefined : visitKindWords[kind]}
      aria-hidden={isNamed ? true : undefined}
    >
      {marks[kind]}
    </svg>
  );
}

import type { PenStrokes } from '@/lib/contracts/sign-offs';
import { strokePath } from '@/lib/signing/stroke-path';

/** A signature drawn again from its strokes. */
export function Signature({ strokes, label }: { strokes: PenStrokes; label: string }) {
  return (
    <svg
      viewBox="0 0 600 260"
      role="img"
      aria-label={label}
      className="w-full max-w-md border-b border-ink"
    >
      <path
        d={strokePath(strokes)}
        fill="none"
        stroke="currentColor"
        strokeWidth={4}
        strokeLinecap="round"
        strokeLinejoin="round"
      />
    </svg>
  );
}

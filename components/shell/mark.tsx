/** Setwell's mark: a corner, and the diagonal that proves it. */
export function Mark({ className }: { className?: string }) {
  return (
    <svg
      viewBox="0 0 24 24"
      width="1.35em"
      height="1.35em"
      aria-hidden="true"
      className={className}
    >
      <path d="M5 2v17h17" fill="none" stroke="currentColor" strokeWidth="3" />
      <path d="M5 5.5 18.5 19" className="stroke-pine" strokeWidth="1.8" />
      <path d="m8.4 4.8-2.8 4.4M18.4 14.6l-3.4 4.2" className="stroke-pine" strokeWidth="1.8" />
    </svg>
  );
}

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
      <path d="M8.5 6 18 15.5" className="stroke-pine" strokeWidth="1.7" />
      <path
        d="M8.5 6h.01M18 15.5h.01"
        className="stroke-pine"
        strokeWidth="4.6"
        strokeLinecap="round"
      />
    </svg>
  );
}

/**
 * The product's own marks, drawn on 22 × 14. The three for a tolerance are a level's vial: the bubble
 * between the lines, on a line, past a line. They read without colour and without a font that has them.
 */
const vial = (
  <path d="M3.5 1.5h15a2 2 0 0 1 2 2v7a2 2 0 0 1-2 2h-15a2 2 0 0 1-2-2v-7a2 2 0 0 1 2-2ZM7.5 2v10M14.5 2v10" />
);
const glyphs = {
  within: (
    <>
      {vial}
      <ellipse cx="11" cy="7" rx="2.4" ry="2.9" />
    </>
  ),
  close: (
    <>
      {vial}
      <ellipse cx="13.6" cy="7" rx="2.4" ry="2.9" fill="currentColor" fillOpacity="0.45" />
    </>
  ),
  over: (
    <>
      {vial}
      <ellipse cx="17.3" cy="7" rx="2.2" ry="3.3" fill="currentColor" />
    </>
  ),
  /** Solid and dashed boxes, as visits stand in the diary. */
  confirmed: (
    <>
      <path d="M4.5 1h13v12h-13Z" />
      <path d="m7.5 7.2 2.6 2.6 4.6-5.4" strokeWidth="1.8" />
    </>
  ),
  waiting: (
    <>
      <path d="M4.5 1h13v12h-13Z" strokeDasharray="2.6 2" />
      <path d="M8 7h.1M11 7h.1M14 7h.1" strokeWidth="2" strokeLinecap="round" />
    </>
  ),
  late: (
    <>
      <circle cx="11" cy="7" r="5.8" />
      <path d="M11 3.4V7l3.2 2" />
    </>
  ),
  problem: (
    <>
      <path d="M11 1.2 18 13H4Z" />
      <path d="M11 5v4M11 11v.2" strokeWidth="1.6" strokeLinecap="round" />
    </>
  ),
  off: (
    <>
      <path d="M4.5 1h13v12h-13Z" strokeDasharray="2.6 2" />
      <path d="m7 3 8 8M15 3l-8 8" strokeWidth="1.6" />
    </>
  ),
};

export type GlyphName = keyof typeof glyphs;

export function Glyph({ name, className }: { name: GlyphName; className?: string }) {
  return (
    <svg
      viewBox="0 0 22 14"
      width="1.57em"
      height="1em"
      aria-hidden="true"
      fill="none"
      stroke="currentColor"
      strokeWidth="1.3"
      className={`inline-block shrink-0 align-[-0.12em] ${className ?? ''}`}
    >
      {glyphs[name]}
    </svg>
  );
}

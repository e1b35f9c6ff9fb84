/**
 * The product's own marks, drawn on 26 × 14. The three for a tolerance are a level's vial: the bubble
 * between the lines, on a line, past a line. They read without colour and without a font that has them.
 */
const vial = (
  <path d="M3 1.2h20a2 2 0 0 1 2 2v7.6a2 2 0 0 1-2 2H3a2 2 0 0 1-2-2V3.2a2 2 0 0 1 2-2ZM8.8 1.5v11M17.2 1.5v11" />
);
const glyphs = {
  within: (
    <>
      {vial}
      <ellipse cx="13" cy="7" rx="2.6" ry="3.2" />
    </>
  ),
  close: (
    <>
      {vial}
      <ellipse cx="17.2" cy="7" rx="2.6" ry="3.2" fill="currentColor" />
    </>
  ),
  over: (
    <>
      {vial}
      <ellipse cx="21.4" cy="7" rx="2.8" ry="5" fill="currentColor" />
    </>
  ),
  /** Solid and dashed boxes, as visits stand in the diary. */
  confirmed: (
    <>
      <path d="M6.5 1h13v12h-13Z" />
      <path d="m9.5 7.2 2.6 2.6 4.6-5.4" strokeWidth="1.8" />
    </>
  ),
  waiting: (
    <>
      <path d="M6.5 1h13v12h-13Z" strokeDasharray="2.6 2" />
      <path d="M10 7h.1M13 7h.1M16 7h.1" strokeWidth="2" strokeLinecap="round" />
    </>
  ),
  late: (
    <>
      <circle cx="13" cy="7" r="5.8" />
      <path d="M13 3.4V7l3.2 2" />
    </>
  ),
  problem: (
    <>
      <path d="M13 1.2 20 13H6Z" />
      <path d="M13 5v4M13 11v.2" strokeWidth="1.6" strokeLinecap="round" />
    </>
  ),
  off: (
    <>
      <path d="M6.5 1h13v12h-13Z" strokeDasharray="2.6 2" />
      <path d="m9 3 8 8M17 3l-8 8" strokeWidth="1.6" />
    </>
  ),
};

export type GlyphName = keyof typeof glyphs;

export function Glyph({ name, className }: { name: GlyphName; className?: string }) {
  return (
    <svg
      viewBox="0 0 26 14"
      width="1.86em"
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

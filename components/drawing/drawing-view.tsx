import type { Drawing } from '@/lib/drawing/shape';
import { DrawnShapes, type HrefOf } from './drawn-shape';

type DrawingViewProps = {
  drawing: Drawing;
  /** "Kitchen, seen from above". */
  title: string;
  hrefOf?: HrefOf;
};

/** A drawing on its sheet, as wide as there is room; parts that lead somewhere are links. */
export function DrawingView({ drawing, title, hrefOf }: DrawingViewProps) {
  const { left, top, width, height } = drawing.bounds;
  // On a phone the drawing keeps a size at which it can be read, and is pushed sideways.
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: what scrolls must be reached by key (WCAG 2.1.1)
    <section aria-label={`${title}, to push sideways`} tabIndex={0} className="overflow-x-auto">
      <svg
        viewBox={[left, top, width, height].map((value) => Math.round(value)).join(' ')}
        role={hrefOf ? 'group' : 'img'}
        aria-label={title}
        className="block h-auto w-full min-w-152 print:min-w-0"
        style={{ maxWidth: `${Math.round(width * 1.15)}px` }}
      >
        <DrawnShapes shapes={drawing.shapes} hrefOf={hrefOf} />
      </svg>
    </section>
  );
}

/** What the drawing must say about itself. */
export function scaleWords(drawing: Drawing, unit: 'in' | 'mm'): string {
  const units = unit === 'in' ? 'inches' : 'millimetres';
  return drawing.exaggeration === 1
    ? `to scale, in ${units}`
    : `to scale, in ${units}; out-of-true drawn ×${drawing.exaggeration}`;
}

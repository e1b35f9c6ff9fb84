import type { ClosureDrawing } from '@/lib/drawing/closure-picture';
import type { Layer } from '@/lib/drawing/shape';
import { DrawnShapes } from './drawn-shape';
import { layerLook } from './layer-look';

type ClosureFigureProps = {
  drawing: ClosureDrawing;
  /** "Kitchen: does it close?" */
  title: string;
};

/** The closure picture, as wide as its place, with a key to its lines: none is told by colour alone. */
export function ClosureFigure({ drawing, title }: ClosureFigureProps) {
  const { left, top, width, height } = drawing.bounds;
  const key = legendOf(drawing).filter(({ layer }) =>
    drawing.shapes.some((shape) => 'layer' in shape && shape.layer === layer),
  );
  return (
    <figure>
      <svg
        viewBox={[left, top, width, height].map((value) => Math.round(value)).join(' ')}
        role="img"
        aria-label={title}
        className="mx-auto block h-auto w-full"
        style={{ maxWidth: `${Math.round(width * 1.15)}px` }}
      >
        <DrawnShapes shapes={drawing.shapes} />
      </svg>
      <figcaption>
        <ul className="flex flex-wrap gap-x-4 gap-y-1 text-note text-graphite">
          {key.map(({ layer, words }) => (
            <li key={layer} className="flex items-center gap-1.5">
              <Swatch layer={layer} />
              {words}
            </li>
          ))}
        </ul>
      </figcaption>
    </figure>
  );
}

/** Every line of the picture, and how many times larger than life what is enlarged is drawn. */
const legendOf = (drawing: ClosureDrawing): { layer: Layer; words: string }[] => [
  { layer: 'wall-face', words: 'walls, evened out' },
  { layer: 'walk-as-read', words: `the walk as read, ×${drawing.walkFactor}` },
  { layer: 'walk-gap', words: 'where it fails to close' },
  { layer: 'error-ellipse', words: `where a corner lies, 95 of 100, ×${drawing.ellipseFactor}` },
  { layer: 'held-corner', words: 'corner held' },
  { layer: 'diagonal', words: 'diagonal read' },
  { layer: 'diagonal-asked', words: 'diagonal to take' },
  { layer: 'suspect-line', words: 'likely misread' },
];

function Swatch({ layer }: { layer: Layer }) {
  return (
    <svg viewBox="0 0 34 12" className="h-3 w-8.5 shrink-0" aria-hidden="true">
      {layer === 'error-ellipse' ? (
        <ellipse cx="17" cy="6" rx="11" ry="4.5" className={layerLook[layer]} />
      ) : layer === 'held-corner' ? (
        <rect x="13" y="2" width="8" height="8" className={layerLook[layer]} />
      ) : (
        <polyline points="1,6 33,6" className={layerLook[layer]} />
      )}
    </svg>
  );
}

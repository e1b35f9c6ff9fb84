import { ClosureFigure } from '@/components/drawing/closure-figure';
import type { FitView } from '@/lib/contracts/rooms';
import { drawClosure } from '@/lib/drawing/closure-picture';
import { closureSays } from '@/lib/drawing/closure-words';
import { InFractions } from './in-fractions';

/** Does the room close: the picture, and the same in words. */
export function ClosurePanel({ view }: { view: Pick<FitView, 'wallBook' | 'fit' | 'rules'> }) {
  const { wallBook, fit, rules } = view;
  const drawing = drawClosure(view, { widthPx: 400 });
  if (!drawing) return <p className="py-2 text-graphite">{fit.closure.words}</p>;
  return (
    <div className="flex flex-col gap-2 pt-2">
      <div className="border border-rule bg-sheet p-2">
        <ClosureFigure drawing={drawing} title={`${wallBook.room.name}: does it close?`} />
      </div>
      {closureSays(fit, drawing, rules).map((words) => (
        <p key={words} className="text-note text-graphite">
          <InFractions words={words} />
        </p>
      ))}
    </div>
  );
}

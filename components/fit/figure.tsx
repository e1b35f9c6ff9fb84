'use client';

import type { FitFigure } from '@/lib/measure/fit-figure';
import { figureText } from '@/lib/sheet/figure-text';
import { FigureValue, SurelyValue } from './figure-value';
import { useFigures } from './figures';

type FigureProps = {
  figure: FitFigure;
  /** What it is the figure of: "Filler left, Sink wall". */
  of: string;
  /** With its U beside it. */
  showsSurely?: boolean;
  isStrong?: boolean;
};

/** A figure that opens: touched, it shows the readings it stands on, its formula, and how sure it is. */
export function Figure({ figure, of, showsSurely = false, isStrong = false }: FigureProps) {
  const { rules, open } = useFigures();
  const { value, surely } = figureText(figure, rules);
  return (
    <button
      type="button"
      onClick={() => open({ figure, of })}
      aria-label={`${of}: ${value}, give or take ${surely}. How it came about`}
      className={`rounded whitespace-nowrap decoration-blueprint decoration-dotted underline-offset-4 hover:bg-tint hover:underline print:no-underline ${
        isStrong ? 'font-bold' : ''
      }`}
    >
      <FigureValue figure={figure} rules={rules} />
      {showsSurely ? (
        <>
          {' '}
          <SurelyValue figure={figure} rules={rules} />
        </>
      ) : null}
    </button>
  );
}

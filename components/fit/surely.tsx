'use client';

import type { FitFigure } from '@/lib/measure/fit-figure';
import { SurelyValue } from './figure-value';
import { useFigures } from './figures';

/** The ± of a figure in a column of its own. */
export function Surely({ figure }: { figure: FitFigure }) {
  return <SurelyValue figure={figure} rules={useFigures().rules} />;
}

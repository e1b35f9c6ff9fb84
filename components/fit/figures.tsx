'use client';

import { createContext, type ReactNode, useCallback, useContext, useMemo, useState } from 'react';
import { Dialog } from '@/components/ui/dialog';
import type { FitRules } from '@/lib/contracts/shop-rules';
import type { FitFigure } from '@/lib/measure/fit-figure';
import type { ReadingLine } from '@/lib/sheet/reading-lines';
import { FigureStory } from './figure-story';

export type Steps = Pick<FitRules, 'unit' | 'stepMm'>;
export type OpenFigure = { figure: FitFigure; of: string };

type FiguresValue = { rules: Steps; open: (figure: OpenFigure) => void };
const FiguresContext = createContext<FiguresValue | null>(null);

/** Around everything that shows figures of one fit: any of them opens to the readings it stands on. */
export function Figures({
  readings,
  rules,
  children,
}: {
  readings: ReadingLine[];
  rules: Steps;
  children: ReactNode;
}) {
  const [opened, setOpened] = useState<OpenFigure | null>(null);
  const { unit, stepMm } = rules;
  const value = useMemo(() => ({ rules: { unit, stepMm }, open: setOpened }), [unit, stepMm]);
  const byId = useMemo(() => new Map(readings.map((line) => [line.id, line])), [readings]);
  const close = useCallback(() => setOpened(null), []);
  return (
    <FiguresContext value={value}>
      {children}
      <Dialog isOpen={opened !== null} onClose={close} title={opened?.of ?? ''}>
        {opened ? <FigureStory figure={opened.figure} rules={value.rules} readings={byId} /> : null}
      </Dialog>
    </FiguresContext>
  );
}

export function useFigures(): FiguresValue {
  const value = useContext(FiguresContext);
  if (!value) throw new Error('a figure is shown outside of Figures');
  return value;
}

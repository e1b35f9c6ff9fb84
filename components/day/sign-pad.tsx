'use client';

import { useEffect, useEffectEvent, useRef } from 'react';
import SignaturePad from 'signature_pad';
import type { PenStrokes } from '@/lib/contracts/sign-offs';
import { keptStrokes } from '@/lib/signing/kept-strokes';
import { PEN_FIELD } from '@/lib/signing/pen-field';

type SignPadProps = { label: string; onChange: (strokes: PenStrokes) => void; isCleared: number };

/** A field that is signed with a finger or a pen; gives the strokes, and holds no picture. */
export function SignPad({ label, onChange, isCleared }: SignPadProps) {
  const canvas = useRef<HTMLCanvasElement>(null);
  const told = useEffectEvent(onChange);

  // biome-ignore lint/correctness/useExhaustiveDependencies: a new count clears the field by drawing it anew
  useEffect(() => {
    const field = canvas.current;
    if (!field) return;
    const ratio = Math.max(1, window.devicePixelRatio);
    const width = field.clientWidth;
    field.width = width * ratio;
    field.height = field.clientHeight * ratio;
    field.getContext('2d')?.scale(ratio, ratio);
    const ink = getComputedStyle(field).color;
    const pad = new SignaturePad(field, { penColor: ink, minDistance: 2 });
    const scale = PEN_FIELD.width / Math.max(1, width);
    const tell = () =>
      told(
        keptStrokes(
          pad
            .toData()
            .map(({ points }) =>
              points.map(({ x, y }): [number, number] => [x * scale, y * scale]),
            ),
        ),
      );
    pad.addEventListener('endStroke', tell);
    return () => {
      pad.removeEventListener('endStroke', tell);
      pad.off();
    };
  }, [isCleared]);

  return (
    <canvas
      ref={canvas}
      role="img"
      aria-label={label}
      style={{ aspectRatio: `${PEN_FIELD.width} / ${PEN_FIELD.height}` }}
      className="block w-full touch-none rounded border border-ink bg-sheet text-ink"
    />
  );
}

'use client';

import { type PointerEvent, useRef } from 'react';
import type { KeptMark } from '@/lib/photos/kept-photo';
import {
  markPath,
  markSizes,
  type PhotoMark,
  type PhotoPoint,
  type PhotoSize,
} from '@/lib/photos/photo-marks';
import { markColours } from './marked-photo';

type PhotoPictureProps = {
  url: string;
  size: PhotoSize;
  caption: string;
  marks: readonly KeptMark[];
  /** A finger came down and went up; null: the picture is only looked at. */
  onMark: ((from: PhotoPoint, to: PhotoPoint) => void) | null;
};

/** The photo with its marks over it, as they will be drawn into it. */
export function PhotoPicture({ url, size, caption, marks, onMark }: PhotoPictureProps) {
  const start = useRef<PhotoPoint | null>(null);
  const { widthPx, heightPx } = size;
  const pointOf = (event: PointerEvent<SVGSVGElement>): PhotoPoint => {
    const box = event.currentTarget.getBoundingClientRect();
    return {
      x: (event.clientX - box.left) / Math.max(1, box.width),
      y: (event.clientY - box.top) / Math.max(1, box.height),
    };
  };
  return (
    <svg
      role="img"
      viewBox={`0 0 ${widthPx} ${heightPx}`}
      style={{ aspectRatio: `${widthPx} / ${heightPx}` }}
      className={`mx-auto block max-h-[58dvh] max-w-full font-sans ${onMark ? 'touch-none select-none' : ''}`}
      onPointerDown={(event) => {
        if (!onMark) return;
        event.currentTarget.setPointerCapture(event.pointerId);
        start.current = pointOf(event);
      }}
      onPointerUp={(event) => {
        if (onMark && start.current) onMark(start.current, pointOf(event));
        start.current = null;
      }}
      onPointerCancel={() => {
        start.current = null;
      }}
    >
      <title>{caption}</title>
      <image href={url} width={widthPx} height={heightPx} />
      {marks.map((mark) => (
        <Mark key={mark.id} mark={mark} size={size} />
      ))}
    </svg>
  );
}

function Mark({ mark, size }: { mark: PhotoMark; size: PhotoSize }) {
  const { linePx, wordsPx } = markSizes(size);
  const { line, under } = markColours;
  if (mark.kind === 'words') {
    return (
      <text
        x={mark.at.x * size.widthPx}
        y={mark.at.y * size.heightPx}
        fontSize={wordsPx}
        textAnchor="middle"
        dominantBaseline="central"
        fill={line}
        stroke={under}
        strokeWidth={linePx * 2}
        paintOrder="stroke"
        className="font-bold"
      >
        {mark.words}
      </text>
    );
  }
  const path = { d: markPath(mark, size), fill: 'none', strokeLinejoin: 'round' as const };
  return (
    <>
      <path {...path} stroke={under} strokeWidth={linePx * 2} strokeLinecap="round" />
      <path {...path} stroke={line} strokeWidth={linePx} strokeLinecap="round" />
    </>
  );
}

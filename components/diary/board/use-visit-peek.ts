'use client';

import { type RefObject, useEffect, useState } from 'react';

/** The visit that is pointed at or has the focus, and where its bar is on the screen. */
export type Peek = { visitId: string; bar: DOMRect };

/** A hand that only crosses the board calls nothing up. */
const restMs = 250;

/**
 * Which visit of the board is looked at: by focus at once, by a mouse at rest. Escape, scrolling and taking hold
 * of anything end it. A finger opens the visit instead.
 */
export function useVisitPeek(boardRef: RefObject<HTMLElement | null>): Peek | null {
  const [peek, setPeek] = useState<Peek | null>(null);

  useEffect(() => {
    const board = boardRef.current;
    if (!board) return;
    let resting: ReturnType<typeof setTimeout> | undefined;

    const end = () => {
      clearTimeout(resting);
      setPeek(null);
    };
    const show = (bar: HTMLElement) => {
      clearTimeout(resting);
      setPeek({ visitId: bar.dataset.visitId ?? '', bar: bar.getBoundingClientRect() });
    };
    const focused = ({ target }: FocusEvent) => {
      const bar = barOf(target);
      if (bar?.matches(':focus-visible')) show(bar);
      else end();
    };
    const over = ({ target, pointerType }: PointerEvent) => {
      if (pointerType === 'touch') return;
      clearTimeout(resting);
      const bar = barOf(target);
      // On the card itself the hand may rest: it may have words to be read twice.
      if (bar) resting = setTimeout(() => show(bar), restMs);
      else if (!(target instanceof Element && target.closest('[data-peek]'))) end();
    };
    const key = (event: KeyboardEvent) => {
      if (event.key === 'Escape') end();
    };
    board.addEventListener('focusin', focused);
    board.addEventListener('focusout', end);
    board.addEventListener('pointerover', over);
    board.addEventListener('pointerleave', end);
    board.addEventListener('pointerdown', end);
    board.addEventListener('scroll', end);
    window.addEventListener('keydown', key);
    return () => {
      clearTimeout(resting);
      board.removeEventListener('focusin', focused);
      board.removeEventListener('focusout', end);
      board.removeEventListener('pointerover', over);
      board.removeEventListener('pointerleave', end);
      board.removeEventListener('pointerdown', end);
      board.removeEventListener('scroll', end);
      window.removeEventListener('keydown', key);
    };
  }, [boardRef]);
  return peek;
}

function barOf(target: EventTarget | null): HTMLElement | null {
  return target instanceof Element ? target.closest<HTMLElement>('[data-visit-id]') : null;
}

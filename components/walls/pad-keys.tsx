'use client';

import { type ReactNode, useEffect, useEffectEvent } from 'react';
import type { PadKey } from '@/lib/walls-pad/pad-entry';

type PadKeysProps = {
  /** Bottom left: feet for inches, a point for millimetres and degrees, a sign for what may be below 0. */
  cornerKey: 'ft' | 'point' | 'sign';
  onKey: (key: PadKey) => void;
  nextWords: string;
  onNext: () => void;
  isBusy: boolean;
  /** It will be pressed by itself in a moment. */
  isGoing?: boolean;
  /** Keeps this value and asks the same once more; null where that means nothing. */
  onAgain: (() => void) | null;
};

const cornerWords = { ft: 'ft', point: '.', sign: '±' };
const cornerSpoken = { ft: 'feet', point: 'point', sign: 'plus or minus' };

/** Digits under the thumb; the system keyboard never opens. A real keyboard, where there is one, types too. */
export function PadKeys(props: PadKeysProps) {
  const { cornerKey, onKey, nextWords, onNext, isBusy, isGoing = false, onAgain } = props;
  useRealKeyboard(onKey, onNext);
  const digit = (key: PadKey) => (
    <Key key={key} onPress={() => onKey(key)} className="text-title font-medium">
      {key}
    </Key>
  );
  return (
    <div className="grid max-h-76 min-h-56 flex-1 grid-cols-4 grid-rows-[repeat(4,minmax(3.5rem,1fr))] gap-px border-b border-rule bg-rule pb-[env(safe-area-inset-bottom)]">
      {(['7', '8', '9'] as const).map(digit)}
      <Key onPress={() => onKey('back')} label="take the last back">
        ⌫
      </Key>
      {(['4', '5', '6'] as const).map(digit)}
      <Key onPress={() => onKey('clear')}>clear</Key>
      {(['1', '2', '3'] as const).map(digit)}
      <button
        type="button"
        onClick={onNext}
        aria-busy={isBusy}
        className="relative row-span-2 touch-manipulation overflow-hidden bg-pine text-lead font-bold text-on-fill select-none active:opacity-90"
      >
        {nextWords}
        {isGoing ? (
          <span
            aria-hidden="true"
            className="pad-going absolute inset-x-0 bottom-0 h-2 bg-on-fill"
          />
        ) : null}
      </button>
      <Key onPress={() => onKey(cornerKey)} label={cornerSpoken[cornerKey]} className="text-lead">
        {cornerWords[cornerKey]}
      </Key>
      <Key
        onPress={() => onKey('0')}
        className={`text-title font-medium ${onAgain ? '' : 'col-span-2'}`}
      >
        0
      </Key>
      {onAgain ? (
        <Key onPress={onAgain} className="leading-tight">
          again
          <span className="block text-note">2nd reading</span>
        </Key>
      ) : null}
    </div>
  );
}

function Key({
  onPress,
  label,
  className = '',
  children,
}: {
  onPress: () => void;
  label?: string;
  className?: string;
  children: ReactNode;
}) {
  return (
    <button
      type="button"
      aria-label={label}
      onClick={onPress}
      className={`touch-manipulation bg-sheet select-none active:bg-tint ${className}`}
    >
      {children}
    </button>
  );
}

const realKeys: Record<string, PadKey> = {
  "'": 'ft',
  '.': 'point',
  ',': 'point',
  '-': 'sign',
  Backspace: 'back',
  Escape: 'clear',
};

function useRealKeyboard(onKey: (key: PadKey) => void, onNext: () => void): void {
  const hear = useEffectEvent((event: KeyboardEvent) => {
    if (event.ctrlKey || event.metaKey || event.altKey || event.defaultPrevented) return;
    const target = event.target instanceof HTMLElement ? event.target.tagName : '';
    if (/^(INPUT|TEXTAREA|SELECT)$/.test(target)) return;
    const isOnButton = /^(BUTTON|A)$/i.test(target);
    if (event.key === 'Enter' && !isOnButton) {
      event.preventDefault();
      onNext();
      return;
    }
    const key = /^\d$/.test(event.key) ? (event.key as PadKey) : realKeys[event.key];
    if (!key) return;
    event.preventDefault();
    onKey(key);
  });
  useEffect(() => {
    const listen = (event: KeyboardEvent) => hear(event);
    window.addEventListener('keydown', listen);
    return () => window.removeEventListener('keydown', listen);
  }, []);
}

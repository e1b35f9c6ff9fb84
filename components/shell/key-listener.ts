'use client';

import { useEffect } from 'react';
import { stepKeys } from './key-bindings';
import { pageKeyBindings } from './page-keys';

const sequenceMs = 1200;
const offKey = 'setwell.single-keys';

/** Some people speak to their computer, and every word would press keys (WCAG 2.1.4): they can be turned off. */
export const areSingleKeysOn = () => localStorage.getItem(offKey) !== 'off';
export const keepSingleKeys = (isOn: boolean) => localStorage.setItem(offKey, isOn ? 'on' : 'off');

/** Hears the keys of the page; mounted once, by the office shell. `?` answers even when keys are off. */
export function useKeyListener(): void {
  useEffect(() => {
    let pressed = '';
    let pressedAt = 0;

    const hear = (event: KeyboardEvent) => {
      if (event.defaultPrevented || event.ctrlKey || event.metaKey || event.altKey) return;
      if (isTyping(event.target) || document.querySelector('dialog[open]')) return;
      if (event.key === 'Shift' || (event.key !== '?' && !areSingleKeysOn())) return;

      const isSequence = event.timeStamp - pressedAt < sequenceMs;
      const step = stepKeys(pageKeyBindings(), isSequence ? pressed : '', event.key);
      pressed = step.pressed;
      pressedAt = event.timeStamp;
      if (!step.binding) return;
      event.preventDefault();
      step.binding.run();
    };
    document.addEventListener('keydown', hear);
    return () => document.removeEventListener('keydown', hear);
  }, []);
}

function isTyping(target: EventTarget | null): boolean {
  return (
    target instanceof HTMLElement &&
    (target.isContentEditable || /^(INPUT|TEXTAREA|SELECT)$/.test(target.tagName))
  );
}

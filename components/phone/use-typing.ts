import { useEffect } from 'react';
import { holdTyping } from './typing-state';

/** While it is true, no newer program takes the place of this one. */
export function useTyping(isHalfTyped: boolean): void {
  useEffect(() => (isHalfTyped ? holdTyping() : undefined), [isHalfTyped]);
}

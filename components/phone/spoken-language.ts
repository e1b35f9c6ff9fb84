'use client';

import { useSyncExternalStore } from 'react';
import type { CrewLanguage } from '@/lib/words/crew';

const key = 'setwell.language';
const changed = 'setwell-language';

/** What this phone speaks: as its holder chose, else as the phone itself is set. */
function currentLanguage(): CrewLanguage {
  try {
    const chosen = localStorage.getItem(key);
    if (chosen === 'en' || chosen === 'es') return chosen;
  } catch {
    // A browser that keeps nothing still has a language of its own.
  }
  return navigator.language.startsWith('es') ? 'es' : 'en';
}

export function chooseLanguage(language: CrewLanguage): void {
  try {
    localStorage.setItem(key, language);
  } catch {
    // Chosen for this page alone then.
  }
  window.dispatchEvent(new Event(changed));
}

function subscribe(listener: () => void): () => void {
  window.addEventListener(changed, listener);
  window.addEventListener('storage', listener);
  return () => {
    window.removeEventListener(changed, listener);
    window.removeEventListener('storage', listener);
  };
}

export function useCrewLanguage(): CrewLanguage {
  return useSyncExternalStore(subscribe, currentLanguage, () => 'en');
}

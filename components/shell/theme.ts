/** How the page is lit: as the system has it, or always light, or always dark. Kept on this device. */
export const themes = ['system', 'light', 'dark'] as const;
export type Theme = (typeof themes)[number];

const key = 'setwell.theme';

/** Runs before the first paint, so that a dark page never flashes white. */
export const themeScript = `try{var t=localStorage.getItem('${key}');if(t==='light'||t==='dark')document.documentElement.dataset.theme=t}catch(e){}`;

export function keptTheme(): Theme {
  const kept = localStorage.getItem(key);
  return themes.find((theme) => theme === kept) ?? 'system';
}

export function keepTheme(theme: Theme): void {
  if (theme === 'system') {
    localStorage.removeItem(key);
    delete document.documentElement.dataset.theme;
  } else {
    localStorage.setItem(key, theme);
    document.documentElement.dataset.theme = theme;
  }
  window.dispatchEvent(new Event(themeChanged));
}

/** Also hears the other tabs of this device. */
export function subscribeToTheme(listener: () => void): () => void {
  window.addEventListener(themeChanged, listener);
  window.addEventListener('storage', listener);
  return () => {
    window.removeEventListener(themeChanged, listener);
    window.removeEventListener('storage', listener);
  };
}

const themeChanged = 'setwell:theme';

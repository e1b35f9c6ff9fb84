'use client';

import { useSyncExternalStore } from 'react';
import { keepTheme, keptTheme, subscribeToTheme, themes } from './theme';

const words = { system: 'system', light: 'light', dark: 'dark' };

export function ThemeSwitch() {
  const theme = useSyncExternalStore(subscribeToTheme, keptTheme, () => 'system' as const);
  return (
    <label className="flex items-center gap-1.5 text-note text-graphite">
      Screen
      <select
        value={theme}
        onChange={(event) => {
          const chosen = themes.find((known) => known === event.target.value);
          if (chosen) keepTheme(chosen);
        }}
        className="min-h-7 min-w-0 flex-1 rounded border border-rule bg-sheet px-1 text-ink"
      >
        {themes.map((known) => (
          <option key={known} value={known}>
            {words[known]}
          </option>
        ))}
      </select>
    </label>
  );
}

'use client';

import { useCallback, useEffect, useState } from 'react';
import type { SortOrder } from './sort-rows';

/** How a person left a table: its order, the words typed, the choice made in each column. */
export type TableView = {
  order: SortOrder | null;
  typed: string;
  choices: Record<string, string>;
};

/** The view of one table, kept on this device. Starts as given, so that server and browser agree. */
export function useRememberedView(
  name: string,
  start: TableView,
): [TableView, (change: Partial<TableView>) => void] {
  const [view, setView] = useState(start);
  const key = `setwell.table.${name}`;

  useEffect(() => {
    const kept = readView(localStorage.getItem(key));
    if (kept) setView(kept);
  }, [key]);

  const changeView = useCallback(
    (change: Partial<TableView>) => {
      setView((current) => {
        const next = { ...current, ...change };
        localStorage.setItem(key, JSON.stringify(next));
        return next;
      });
    },
    [key],
  );
  return [view, changeView];
}

function readView(text: string | null): TableView | null {
  if (!text) return null;
  try {
    const { order, typed, choices } = JSON.parse(text) as TableView;
    const isOrder = order === null || typeof order?.column === 'string';
    return isOrder && typeof typed === 'string' && typeof choices === 'object' && choices
      ? { order, typed, choices }
      : null;
  } catch {
    return null;
  }
}

'use client';

import { useEffect, useEffectEvent } from 'react';
import type { KeyBinding } from './key-bindings';

type Group = { title: string; bindings: readonly KeyBinding[] };

const groups: Group[] = [];

/**
 * Gives the page its keys while it is shown; `?` lists them under the title. The bindings may be new at
 * each render: the newest `run` is the one that runs.
 */
export function usePageKeys(title: string, bindings: readonly KeyBinding[]): void {
  const run = useEffectEvent((keys: string) => {
    bindings.find((binding) => binding.keys === keys)?.run();
  });
  const list = bindings.map(({ keys, words }) => `${keys}\t${words}`).join('\n');

  useEffect(() => {
    const kept = list === '' ? [] : list.split('\n').map((line) => line.split('\t'));
    const group: Group = {
      title,
      bindings: kept.map(([keys = '', words = '']) => ({ keys, words, run: () => run(keys) })),
    };
    groups.push(group);
    return () => {
      groups.splice(groups.indexOf(group), 1);
    };
  }, [title, list]);
}

export const pageKeyGroups = (): readonly Group[] => groups;
export const pageKeyBindings = (): KeyBinding[] => groups.flatMap((group) => group.bindings);

'use client';

import dynamic from 'next/dynamic';
import { useRouter } from 'next/navigation';
import { undoNewest } from '@/components/ui/toast-store';
import type { Role } from '@/lib/permissions';
import { useKeyListener } from './key-listener';
import { officePagesFor } from './office-pages';
import { openList, useOpenList } from './open-list';
import { usePageKeys } from './page-keys';

// Fetched when first asked for: most people open neither on most days.
const CommandList = dynamic(() => import('./command-list').then((module) => module.CommandList));
const KeyList = dynamic(() => import('./key-list').then((module) => module.KeyList));

/** The keys of the whole office and the lists they open; mounted once, by the shell. */
export function OfficeKeys({ role }: { role: Role }) {
  const router = useRouter();
  const open = useOpenList();
  const pages = officePagesFor(role);
  const close = () => openList(null);

  usePageKeys('Everywhere', [
    { keys: '/', words: 'Find a job or a page', run: () => openList('commands') },
    { keys: '?', words: 'This list', run: () => openList('keys') },
    { keys: 'u', words: 'Undo what was just done', run: () => undoNewest() },
    ...pages.map((page) => ({
      keys: `g ${page.letter.toLowerCase()}`,
      words: page.word,
      run: () => router.push(page.path),
    })),
  ]);
  useKeyListener();

  if (open === 'commands') return <CommandList pages={pages} onClose={close} />;
  return open === 'keys' ? <KeyList onClose={close} /> : null;
}

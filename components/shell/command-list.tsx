'use client';

import { useRouter } from 'next/navigation';
import { type KeyboardEvent, useDeferredValue, useId, useState } from 'react';
import { Dialog } from '@/components/ui/dialog';
import { controlLook } from '@/components/ui/field-frame';
import { KeyHint } from '@/components/ui/key-hint';
import { matchesWords } from '@/components/ui/sort-rows';
import { paths } from '@/lib/paths';
import { stageWords } from '@/lib/schedule/stages';
import { problemOf } from './ask-server';
import { type Command, CommandOption } from './command-option';
import { useJobSearch } from './job-search-query';
import type { OfficePage } from './office-pages';

/** Type a name, a street, a phone number or a page; the arrows choose, Enter goes there. */
export function CommandList({ pages, onClose }: { pages: OfficePage[]; onClose: () => void }) {
  const router = useRouter();
  const listId = useId();
  const [typed, setTyped] = useState('');
  const [chosenAt, setChosenAt] = useState(0);
  const search = useDeferredValue(typed);
  const jobs = useJobSearch(search);
  const commands = commandsFor(pages, typed, typed.trim().length < 2 ? [] : (jobs.data ?? []));
  const chosen = Math.min(chosenAt, commands.length - 1);

  const goTo = (command: Command | undefined) => {
    if (!command) return;
    onClose();
    router.push(command.path);
  };
  const steer = (event: KeyboardEvent) => {
    const step = { ArrowDown: 1, ArrowUp: -1 }[event.key];
    if (step) {
      event.preventDefault();
      setChosenAt((chosen + step + commands.length) % Math.max(commands.length, 1));
    } else if (event.key === 'Enter') {
      event.preventDefault();
      goTo(commands[chosen]);
    }
  };

  return (
    <Dialog isOpen onClose={onClose} title="Find" className="mt-[12dvh]">
      <input
        type="text"
        role="combobox"
        aria-label="Name, street, phone or page"
        placeholder="Name, street, phone or page"
        aria-expanded="true"
        aria-controls={listId}
        aria-activedescendant={commands[chosen] ? `${listId}-${chosen}` : undefined}
        autoComplete="off"
        value={typed}
        onChange={(event) => {
          setTyped(event.target.value);
          setChosenAt(0);
        }}
        onKeyDown={steer}
        className={controlLook}
      />
      <div id={listId} role="listbox" aria-label="Found" className="max-h-[50dvh] overflow-y-auto">
        {commands.map((command, at) => (
          <CommandOption
            key={command.path}
            id={`${listId}-${at}`}
            command={command}
            isChosen={at === chosen}
            onChoose={onClose}
          />
        ))}
      </div>
      <p role="status" className="text-note text-graphite">
        {jobs.isError
          ? problemOf(jobs.error).title
          : commands.length === 0
            ? jobs.isFetching
              ? 'Looking…'
              : 'Nothing by that name. Try the street or the phone number.'
            : null}
      </p>
      <KeyHint keys="↑ ↓ Enter" />
    </Dialog>
  );
}

function commandsFor(
  pages: OfficePage[],
  typed: string,
  jobs: NonNullable<ReturnType<typeof useJobSearch>['data']>,
): Command[] {
  const places = pages
    .filter((page) => matchesWords(page.word, typed))
    .map((page) => ({
      path: page.path,
      words: page.word,
      note: 'page',
      detail: '',
      keys: `G ${page.letter}`,
    }));
  const found = jobs.map((job) => ({
    path: paths.job(job.id),
    words: `${job.customerName}, ${job.street}`,
    note: stageWords[job.stage],
    detail: `${job.number} · ${job.title}`,
  }));
  return [...found, ...places];
}

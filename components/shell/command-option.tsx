import Link from 'next/link';
import { useEffect, useRef } from 'react';
import { KeyHint } from '@/components/ui/key-hint';

/** One place that the list of commands can go to. */
export type Command = { path: string; words: string; detail: string; note: string; keys?: string };

type CommandOptionProps = {
  id: string;
  command: Command;
  isChosen: boolean;
  onChoose: () => void;
};

/** The field above keeps the focus and hears the keys; the pointer presses this. */
export function CommandOption({ id, command, isChosen, onChoose }: CommandOptionProps) {
  const ref = useRef<HTMLAnchorElement>(null);
  useEffect(() => {
    if (isChosen) ref.current?.scrollIntoView({ block: 'nearest' });
  }, [isChosen]);

  return (
    <Link
      ref={ref}
      id={id}
      role="option"
      tabIndex={-1}
      aria-selected={isChosen}
      href={command.path}
      prefetch={false}
      onClick={onChoose}
      className={`flex min-h-11 items-center justify-between gap-4 border-l-4 px-3 py-2 hover:bg-tint ${
        isChosen ? 'border-pine bg-tint' : 'border-transparent'
      }`}
    >
      <span className="min-w-0">
        <span className="font-medium">{command.words}</span>
        {command.detail ? (
          <span className="block truncate text-note text-graphite">{command.detail}</span>
        ) : null}
      </span>
      <span className="shrink-0 text-note text-graphite">
        {command.keys ? <KeyHint keys={command.keys} /> : command.note}
      </span>
    </Link>
  );
}

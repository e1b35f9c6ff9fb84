import { classNames } from './class-names';

/** Keys as printed on the keyboard: "N", or "G D" for one after the other. Hidden where there are none. */
export function KeyHint({ keys, isOnFill = false }: { keys: string; isOnFill?: boolean }) {
  return (
    <span aria-hidden="true" className="hidden items-center gap-0.5 sm:inline-flex print:hidden">
      {keys.split(' ').map((key) => (
        <kbd
          key={key}
          className={classNames(
            'min-w-5 rounded border border-b-2 px-1 text-center font-sans text-note leading-snug font-medium',
            isOnFill ? 'border-current' : 'border-rule bg-sheet text-graphite',
          )}
        >
          {key}
        </kbd>
      ))}
    </span>
  );
}

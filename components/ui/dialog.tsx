'use client';

import {
  type MouseEvent,
  type ReactNode,
  type SyntheticEvent,
  useEffect,
  useId,
  useRef,
} from 'react';
import { Button } from './button';
import { classNames } from './class-names';
import { TitleBlock } from './title-block';

type DialogProps = {
  isOpen: boolean;
  onClose: () => void;
  title: string;
  children: ReactNode;
  /** Buttons at the foot, the thing to do first. */
  footer?: ReactNode;
  className?: string;
};

/** Whichever stands first; a dialog may put a button before its fields, for what is wanted most. */
const firstToFocus = '[data-first-focus], input, select, textarea, footer button';

/** A sheet laid over the page: the browser's own dialog, so focus, Escape and the backdrop are its own. */
export function Dialog({ isOpen, onClose, title, children, footer, className }: DialogProps) {
  const ref = useRef<HTMLDialogElement>(null);
  const titleId = useId();

  useEffect(() => {
    const dialog = ref.current;
    if (!dialog || !isOpen) return;
    const focusedBefore = document.activeElement;
    dialog.showModal();
    dialog.querySelector<HTMLElement>(firstToFocus)?.focus();
    return () => {
      dialog.close();
      // A dialog that is taken away whole does not give the focus back by itself.
      if (document.activeElement === document.body && focusedBefore instanceof HTMLElement) {
        focusedBefore.focus();
      }
    };
  }, [isOpen]);

  // The event comes late: an effect that ran twice may have opened the dialog again by then.
  const closeUnlessOpenedAgain = (event: SyntheticEvent<HTMLDialogElement>) => {
    if (!event.currentTarget.open) onClose();
  };
  const closeOnBackdrop = (event: MouseEvent<HTMLDialogElement>) => {
    if (event.target === event.currentTarget) onClose();
  };

  return (
    <dialog
      ref={ref}
      aria-labelledby={titleId}
      onClose={closeUnlessOpenedAgain}
      onMouseDown={closeOnBackdrop}
      className={classNames(
        'm-auto max-h-[90dvh] w-[calc(100%-2rem)] max-w-xl rounded border border-ink bg-sheet p-0 text-ink',
        className,
      )}
    >
      {isOpen ? (
        <div className="flex flex-col gap-4 px-5 py-4">
          <TitleBlock
            id={titleId}
            title={title}
            meta={
              <Button look="plain" onClick={onClose} className="-mr-3">
                Close
              </Button>
            }
          />
          {children}
          {footer ? <footer className="flex flex-wrap gap-2">{footer}</footer> : null}
        </div>
      ) : null}
    </dialog>
  );
}

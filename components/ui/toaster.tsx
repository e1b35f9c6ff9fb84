'use client';

import { useEffect, useRef, useSyncExternalStore } from 'react';
import { Button } from './button';
import {
  closeToast,
  currentToasts,
  subscribeToToasts,
  type Toast,
  toastSeconds,
} from './toast-store';

const none: readonly Toast[] = [];

/** Mounted once by a shell; shows what `showToast` adds. */
export function Toaster() {
  const toasts = useSyncExternalStore(subscribeToToasts, currentToasts, () => none);
  return (
    <div
      role="status"
      className="fixed bottom-4 left-1/2 z-40 flex w-[min(32rem,calc(100%-2rem))] -translate-x-1/2 flex-col gap-2 print:hidden"
    >
      {toasts.map((toast) => (
        <ToastLine key={toast.id} toast={toast} />
      ))}
    </div>
  );
}

function ToastLine({ toast }: { toast: Toast }) {
  const ref = useRef<HTMLDivElement>(null);

  useEffect(() => {
    if (toast.isProblem) return;
    let timer = setTimeout(leave, toastSeconds * 1000);
    // A hand on it holds it: whoever is about to press Undo gets the time to.
    function leave() {
      if (!ref.current?.matches(':hover, :focus-within')) return closeToast(toast.id);
      timer = setTimeout(leave, 1000);
    }
    return () => clearTimeout(timer);
  }, [toast.id, toast.isProblem]);

  return (
    <div
      ref={ref}
      className={`flex items-center justify-between gap-4 rounded border border-l-4 bg-sheet py-1.5 pr-1.5 pl-3 ${
        toast.isProblem ? 'border-chalk' : 'border-ink'
      }`}
    >
      <span>{toast.text}</span>
      <span className="flex shrink-0">
        {toast.undo ? (
          <Button
            look="line"
            keyName="U"
            onClick={() => {
              closeToast(toast.id);
              toast.undo?.();
            }}
          >
            Undo
          </Button>
        ) : null}
        <Button
          look="plain"
          onClick={() => closeToast(toast.id)}
          aria-label={`Close: ${toast.text}`}
        >
          Close
        </Button>
      </span>
    </div>
  );
}

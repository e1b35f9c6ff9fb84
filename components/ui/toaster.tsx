'use client';

import { useEffect, useState, useSyncExternalStore } from 'react';
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
  const [isHeld, setIsHeld] = useState(false);

  useEffect(() => {
    if (isHeld || toast.isProblem) return;
    const timer = setTimeout(() => closeToast(toast.id), toastSeconds * 1000);
    return () => clearTimeout(timer);
  }, [isHeld, toast.id, toast.isProblem]);

  return (
    <div
      onPointerEnter={() => setIsHeld(true)}
      onPointerLeave={() => setIsHeld(false)}
      onFocus={() => setIsHeld(true)}
      onBlur={() => setIsHeld(false)}
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

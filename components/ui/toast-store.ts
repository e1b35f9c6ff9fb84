/** What has just been done, for ten seconds, with the way back. One store for the page: anyone may add. */
export type Toast = {
  id: number;
  text: string;
  /** Takes the thing back; the toast goes when it is pressed. */
  undo?: () => void;
  /** A problem stays until it is closed. */
  isProblem: boolean;
};

export const toastSeconds = 10;

let toasts: readonly Toast[] = [];
let lastId = 0;
const listeners = new Set<() => void>();

export function showToast(toast: { text: string; undo?: () => void; isProblem?: boolean }): number {
  lastId += 1;
  change([...toasts, { isProblem: false, ...toast, id: lastId }]);
  return lastId;
}

export function closeToast(id: number): void {
  change(toasts.filter((toast) => toast.id !== id));
}

/** Takes back the newest thing that can be taken back; false when there is none. */
export function undoNewest(): boolean {
  const newest = toasts.findLast((toast) => toast.undo);
  if (!newest) return false;
  closeToast(newest.id);
  newest.undo?.();
  return true;
}

export function subscribeToToasts(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

export const currentToasts = (): readonly Toast[] => toasts;

function change(next: readonly Toast[]) {
  toasts = next;
  for (const listener of listeners) listener();
}

'use client';

import { Button } from '@/components/ui/button';
import { showToast } from '@/components/ui/toast-store';

type ShownOnceProps = { title: string; text: string; children: string };

/** A secret that is shown this once, to be copied. */
export function ShownOnce({ title, text, children }: ShownOnceProps) {
  const copy = async () => {
    await navigator.clipboard.writeText(text);
    showToast({ text: 'Copied' });
  };
  return (
    <div role="status" className="border-l-4 border-pine bg-tint px-3 py-2">
      <p className="font-bold">{title}</p>
      <p className="my-1 break-all font-mono">{text}</p>
      <p className="mb-2 text-graphite">{children}</p>
      <Button look="line" onClick={copy}>
        Copy
      </Button>
    </div>
  );
}

import type { ReactNode } from 'react';

type StripProps = {
  children: ReactNode /** Right: "saved here · 3 to send". */;
  status?: ReactNode;
};

/** The thin line on top of a screen that always says where you are and how things stand. */
export function Strip({ children, status }: StripProps) {
  return (
    <div className="flex items-baseline justify-between gap-4 border-b border-rule bg-paper px-3.5 py-1.5 text-note print:hidden">
      <div className="min-w-0 truncate">{children}</div>
      {status ? (
        <div role="status" className="shrink-0 font-medium">
          {status}
        </div>
      ) : null}
    </div>
  );
}

import { VerdictNote } from '@/components/ui/verdict-note';

/** Nobody may believe that a customer was told when nothing left the machine. */
export function CarriersNote({ missing }: { missing: readonly string[] }) {
  if (missing.length === 0) return null;
  return (
    <aside aria-label="Not set up" className="mb-4 print:hidden">
      <VerdictNote kind="problem" word="nobody is told">
        No service for {missing.join(' and ')} is set up: they stay on this machine. Whoever runs
        Setwell for you sets it up as its README says.
      </VerdictNote>
    </aside>
  );
}

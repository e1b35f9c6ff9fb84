import { Verdict, type VerdictKind } from '@/components/ui/verdict';
import type { CustomerVisitView } from '@/lib/contracts/visits';
import { customerWords } from './customer-words';

const edges: Partial<Record<VerdictKind, string>> = {
  confirmed: 'border-moss',
  waiting: 'border-ochre',
  late: 'border-chalk',
  problem: 'border-chalk',
  off: 'border-graphite',
};

/** How the visit stands, in one line with its glyph; nothing while we wait for the first answer. */
export function VisitStanding({ visit }: { visit: CustomerVisitView }) {
  const line = standingOf(visit);
  if (!line) return null;
  return (
    <p role="status" className={`mt-3 border-l-4 bg-tint px-3 py-2 ${edges[line.kind]}`}>
      <Verdict kind={line.kind}>{line.text}</Verdict>
    </p>
  );
}

function standingOf(visit: CustomerVisitView): { kind: VerdictKind; text: string } | null {
  const words = customerWords(visit.language);
  const { status, customerSays, arrivalWords } = visit;
  if (status === 'done') return { kind: 'confirmed', text: words.done };
  if (status === 'missed') return { kind: 'problem', text: words.missed };
  if (status === 'called-off') return { kind: 'off', text: words.calledOff };
  if (status === 'on-site') return { kind: 'confirmed', text: words.here };
  if (arrivalWords) return { kind: 'late', text: words.late(arrivalWords) };
  if (status === 'on-the-way') return { kind: 'confirmed', text: words.onTheWay };
  if (customerSays) return { kind: 'waiting', text: words.said(customerSays) };
  return status === 'confirmed' ? { kind: 'confirmed', text: words.thanks } : null;
}

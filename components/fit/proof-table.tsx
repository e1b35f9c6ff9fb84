import { Verdict } from '@/components/ui/verdict';
import type { ProofRow } from '@/lib/sheet/proof-rows';
import { Figure } from './figure';
import { InFractions } from './in-fractions';

/** "Proved on site": each check with what was read, what its rule allows, and whose rule that is. */
export function ProofTable({ rows }: { rows: ProofRow[] }) {
  if (rows.length === 0) {
    return (
      <p className="py-2 text-graphite">
        Nothing is proved yet: no corner, face or floor was read.
      </p>
    );
  }
  return (
    <table className="w-full border-collapse">
      <caption className="sr-only">Proved on site</caption>
      <thead>
        <tr className="border-b border-ink text-note text-graphite">
          {['check', 'read', 'rule', ''].map((header, index) => (
            <th
              key={header}
              scope="col"
              className={`py-1 font-normal ${index === 0 ? 'text-left' : 'pl-2 text-right'}`}
            >
              {header || <span className="sr-only">verdict</span>}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <tr key={row.key} className="border-b border-rule align-baseline">
            <th scope="row" className="py-1.5 text-left font-normal">
              {row.check}
              <span className="block text-note text-graphite">{row.rule}</span>
            </th>
            <td className="pl-2 text-right">
              {row.read ? <Figure figure={row.read} of={row.check} /> : null}
              {row.readWords ? (
                <span className="block text-note text-graphite">{row.readWords}</span>
              ) : null}
            </td>
            <td className="pl-2 text-right">
              <InFractions words={row.limitWords} />
            </td>
            <td className="pl-2 text-right whitespace-nowrap">
              <Verdict kind={row.verdict}>
                {closureWord(row)}
                {row.inDoubt ? ' (in doubt)' : ''}
              </Verdict>
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

function closureWord({ key, verdict }: ProofRow): string {
  if (key !== 'room closes') return verdict;
  return verdict === 'within' ? 'holds' : 'disagree';
}

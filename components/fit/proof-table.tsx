import { Verdict } from '@/components/ui/verdict';
import type { ProofRow } from '@/lib/sheet/proof-rows';
import { Figure } from './figure';
import { InFractions } from './in-fractions';
import { RuleLine } from './rule-line';

/** "Proved on site": each check with what was read, what its rule allows, and whose rule that is. */
export function ProofTable({ rows }: { rows: ProofRow[] }) {
  if (rows.length === 0) {
    return (
      <p className="py-2 text-graphite">
        Nothing is proved yet: no corner, face or floor was read.
      </p>
    );
  }
  const rules = [...new Set(rows.map(({ rule }) => rule))];
  return (
    <table className="w-full border-collapse">
      <caption className="sr-only">Proved on site</caption>
      <thead>
        <tr className="border-b border-ink text-note text-graphite">
          {['check', 'read', 'limit', ''].map((header, index) => (
            <th
              key={header}
              scope="col"
              className={`py-1 font-normal ${index === 0 ? 'text-left' : 'pl-2 text-right last:text-left'}`}
            >
              {header || <span className="sr-only">verdict</span>}
            </th>
          ))}
        </tr>
      </thead>
      {rules.map((rule) => (
        <tbody key={rule}>
          <tr className="hidden print:table-row">
            <th
              scope="rowgroup"
              colSpan={4}
              className="pt-2.5 text-left text-note print:pt-1 font-normal text-graphite"
            >
              {rule}
            </th>
          </tr>
          {rows
            .filter((row) => row.rule === rule)
            .map((row) => (
              <ProofLine key={row.key} row={row} />
            ))}
        </tbody>
      ))}
    </table>
  );
}

function ProofLine({ row }: { row: ProofRow }) {
  return (
    <>
      <tr className="align-top *:pt-1.5 print:border-b print:border-rule print:*:py-px">
        <th scope="row" className="text-left font-normal">
          {row.check}
        </th>
        <td className="pl-2 text-right">
          {row.read ? <Figure figure={row.read} of={row.check} showsSurely /> : null}
          {row.readWords ? (
            <span className="block text-note text-graphite">{row.readWords}</span>
          ) : null}
        </td>
        <td className="pl-2 text-right">
          <InFractions words={row.limitWords} />
        </td>
        <td className="w-0 pl-4 whitespace-nowrap">
          <Verdict kind={row.verdict}>
            {closureWord(row)}
            {row.inDoubt ? ', in doubt' : ''}
          </Verdict>
        </td>
      </tr>
      <tr className="border-b border-rule print:hidden">
        <td colSpan={4} className="pb-1.5 text-note text-graphite">
          {row.by ? <RuleLine by={row.by} /> : row.rule}
        </td>
      </tr>
    </>
  );
}

function closureWord({ key, verdict }: ProofRow): string {
  if (key !== 'room closes') return verdict;
  return verdict === 'within' ? 'holds' : 'disagree';
}

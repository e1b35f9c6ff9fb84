import type { RuleChange } from '@/lib/rules/rule-changes';

/** Rule by rule: from what, to what, and what it moves. */
export function ChangeTable({ changes }: { changes: RuleChange[] }) {
  return (
    <table className="w-full">
      <thead className="sr-only">
        <tr>
          <th scope="col">Rule</th>
          <th scope="col">From and to</th>
          <th scope="col">What it moves</th>
        </tr>
      </thead>
      <tbody>
        {changes.map(({ label, from, to, affects }) => (
          <tr key={label} className="border-b border-rule align-baseline">
            <th scope="row" className="py-1 pr-4 text-left font-medium">
              {label}
            </th>
            <td className="py-1 pr-4 tabular-nums">
              <s className={`text-graphite ${inOnePiece(from)}`}>{from}</s> →{' '}
              <span className={inOnePiece(to)}>{to}</span>
            </td>
            <td className="py-1 text-graphite">{affects}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}

/** `2 1/2"` is one figure; a list of days may break. */
const inOnePiece = (words: string) => (words.length < 24 ? 'whitespace-nowrap' : '');

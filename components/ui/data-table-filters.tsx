import type { ReactNode } from 'react';
import type { Column } from './data-table';
import { controlLook } from './field-frame';
import type { TableView } from './remembered-view';

type DataTableFiltersProps<Row> = {
  rows: readonly Row[];
  columns: Column<Row>[];
  view: TableView;
  changeView: (change: Partial<TableView>) => void;
  filterLabel?: string;
  tools?: ReactNode;
};

export function DataTableFilters<Row>({
  rows,
  columns,
  view,
  changeView,
  filterLabel,
  tools,
}: DataTableFiltersProps<Row>) {
  const choosing = columns.filter((column) => column.choice);
  if (!filterLabel && choosing.length === 0 && !tools) return null;
  return (
    <div className="flex flex-wrap items-center gap-2 py-2 print:hidden">
      {filterLabel ? (
        <input
          type="search"
          aria-label={filterLabel}
          placeholder={filterLabel}
          value={view.typed}
          onChange={(event) => changeView({ typed: event.target.value })}
          className={`${controlLook} max-w-72`}
        />
      ) : null}
      {choosing.map((column) => (
        <select
          key={column.key}
          aria-label={column.header}
          value={view.choices[column.key] ?? ''}
          onChange={(event) =>
            changeView({ choices: { ...view.choices, [column.key]: event.target.value } })
          }
          className={`${controlLook} max-w-52`}
        >
          <option value="">{column.header}: all</option>
          {choicesOf(rows, column).map(([choice, count]) => (
            <option key={choice} value={choice}>
              {choice} ({count})
            </option>
          ))}
        </select>
      ))}
      {tools ? <div className="ml-auto flex gap-2">{tools}</div> : null}
    </div>
  );
}

/** The values present, in the order in which the rows first show them, with how often. */
function choicesOf<Row>(rows: readonly Row[], column: Column<Row>): [string, number][] {
  const counts = new Map<string, number>();
  for (const row of rows) {
    const choice = column.choice?.(row);
    if (choice) counts.set(choice, (counts.get(choice) ?? 0) + 1);
  }
  return [...counts];
}

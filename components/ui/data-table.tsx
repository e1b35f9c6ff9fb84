'use client';

import { type ReactNode, useEffect, useMemo } from 'react';
import { Button } from './button';
import { DataTableFilters } from './data-table-filters';
import { DataTableHead } from './data-table-head';
import { type TableView, useRememberedView } from './remembered-view';
import { matchesWords, type SortOrder, type SortValue, sortRows } from './sort-rows';

export type Column<Row> = {
  key: string;
  header: string;
  cell: (row: Row) => ReactNode;
  /** Absent: this column does not sort. */
  sortValue?: (row: Row) => SortValue;
  /** What typed words are looked for in. */
  text?: (row: Row) => string;
  /** The value a person may choose by, where a column has few: a stage, a crew. */
  choice?: (row: Row) => string;
  /** Readings stand right, so that their digits line up. */
  isNumber?: boolean;
  /** Left out on a phone, where it would push what matters off the side. */
  isForDesk?: boolean;
  className?: string;
};

type DataTableProps<Row> = {
  /** Its view is remembered under this name. */
  name: string;
  /** Said to screen readers: "Jobs, 38". */
  caption: string;
  rows: readonly Row[];
  columns: Column<Row>[];
  rowKey: (row: Row) => string;
  order?: SortOrder;
  /** Absent: no line to type in. */
  filterLabel?: string;
  /** Beside the filters. */
  tools?: ReactNode;
  /** Beside the filters, for what keeps or takes up a whole view. */
  viewTools?: (view: TableView, changeView: (change: Partial<TableView>) => void) => ReactNode;
  /** Hears what is typed, for tables whose rows are not all here. */
  onTyped?: (typed: string) => void;
  /** Rows that match what is typed by more than their columns show; shown with the rest. */
  alsoFound?: readonly Row[];
  /** In place of the table while there are no rows at all. */
  empty?: ReactNode;
};

/** A table that sorts, filters, and is found again as it was left. */
export function DataTable<Row>({
  name,
  caption,
  rows,
  columns,
  rowKey,
  order,
  filterLabel,
  tools,
  viewTools,
  onTyped,
  alsoFound,
  empty,
}: DataTableProps<Row>) {
  const start: TableView = { order: order ?? null, typed: '', choices: {} };
  const [view, changeView] = useRememberedView(name, start);
  const shown = useMemo(
    () => shownRows(rows, columns, view, { alsoFound, rowKey }),
    [rows, columns, view, alsoFound, rowKey],
  );
  useEffect(() => onTyped?.(view.typed), [onTyped, view.typed]);

  if (rows.length === 0 && empty) return empty;
  return (
    <div className="min-w-0">
      <DataTableFilters
        {...{ rows, columns, view, changeView, filterLabel }}
        tools={
          viewTools ? (
            <>
              {viewTools(view, changeView)}
              {tools}
            </>
          ) : (
            tools
          )
        }
      />
      <div className="overflow-x-auto">
        <table className="w-full border-collapse">
          <caption className="sr-only">{caption}</caption>
          <DataTableHead
            {...{ columns, order: view.order }}
            onOrder={(next) => changeView({ order: next })}
          />
          <tbody>
            {shown.map((row) => (
              <tr
                key={rowKey(row)}
                className="border-b border-rule hover:bg-tint focus-within:bg-tint"
              >
                {columns.map((column) => (
                  <td
                    key={column.key}
                    className={`px-2 py-1.5 align-baseline first:pl-0 last:pr-0 ${
                      column.isNumber ? 'text-right whitespace-nowrap' : ''
                    } ${column.isForDesk ? 'max-md:hidden' : ''} ${column.className ?? ''}`}
                  >
                    {column.cell(row)}
                  </td>
                ))}
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      <p role="status" className="pt-2 text-note text-graphite">
        {shown.length === rows.length
          ? `${rows.length} in all`
          : `${shown.length} of ${rows.length}`}
        {shown.length < rows.length ? (
          <Button
            look="plain"
            className="ml-2"
            onClick={() => changeView({ typed: '', choices: {} })}
          >
            Show all
          </Button>
        ) : null}
      </p>
    </div>
  );
}

function shownRows<Row>(
  rows: readonly Row[],
  columns: Column<Row>[],
  view: TableView,
  { alsoFound = [], rowKey }: { alsoFound?: readonly Row[]; rowKey: (row: Row) => string },
): Row[] {
  const found = view.typed ? alsoFound : [];
  const foundKeys = new Set(found.map(rowKey));
  const others = rows.filter((row) => !foundKeys.has(rowKey(row)));
  const isTyped = (row: Row) =>
    matchesWords(columns.map((column) => column.text?.(row) ?? '').join(' '), view.typed);
  const isChosen = (row: Row) =>
    columns.every((column) => {
      const wanted = view.choices[column.key];
      return !wanted || !column.choice || column.choice(row) === wanted;
    });
  const kept = [...found, ...others.filter(isTyped)].filter(isChosen);
  const { order } = view;
  const sortValue = columns.find((column) => column.key === order?.column)?.sortValue;
  return order && sortValue ? sortRows(kept, sortValue, order.isDescending) : kept;
}

import type { Column } from './data-table';
import type { SortOrder } from './sort-rows';

type DataTableHeadProps<Row> = {
  columns: Column<Row>[];
  order: SortOrder | null;
  onOrder: (order: SortOrder) => void;
};

export function DataTableHead<Row>({ columns, order, onOrder }: DataTableHeadProps<Row>) {
  return (
    <thead>
      <tr className="border-b border-ink">
        {columns.map((column) => {
          const isSorted = order?.column === column.key;
          const isDescending = isSorted && order.isDescending;
          const arrow = isSorted ? (
            <span aria-hidden="true" className="px-1">
              {isDescending ? '↓' : '↑'}
            </span>
          ) : null;
          return (
            <th
              key={column.key}
              scope="col"
              aria-sort={isSorted ? (isDescending ? 'descending' : 'ascending') : undefined}
              className={`h-8 px-2 align-middle text-note font-normal text-graphite first:pl-0 last:pr-0 ${
                column.isNumber ? 'text-right' : 'text-left'
              } ${column.isForDesk ? 'max-md:hidden' : ''}`}
            >
              {column.sortValue ? (
                <button
                  type="button"
                  className={`min-h-7 hover:text-ink hover:underline ${isSorted ? 'font-medium text-ink' : ''}`}
                  onClick={() =>
                    onOrder({ column: column.key, isDescending: isSorted && !isDescending })
                  }
                >
                  {column.isNumber ? arrow : null}
                  {column.header}
                  {column.isNumber ? null : arrow}
                </button>
              ) : (
                column.header
              )}
            </th>
          );
        })}
      </tr>
    </thead>
  );
}

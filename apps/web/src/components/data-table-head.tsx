import { ArrowDown, ArrowUp, ChevronsUpDown } from 'lucide-react';
import { classNames } from '../lib/class-names.ts';
import { tableRoles } from './table-roles.ts';
import type { Column } from './column.ts';

export interface TableSorting {
  id: string;
  desc: boolean;
}

interface DataTableHeadProps<Row> {
  columns: readonly Column<Row>[];
  sorting: TableSorting | undefined;
  onSort: (id: string, desc: boolean) => void;
}

/** The headers, each a button that sorts; they stay in sight. */
export function DataTableHead<Row>({ columns, sorting, onSort }: DataTableHeadProps<Row>) {
  return (
    <thead
      {...tableRoles.group}
      className="sticky top-0 z-10 hidden bg-card shadow-[0_1px_0_var(--color-edge)] lg:table-header-group"
    >
      <tr {...tableRoles.row}>
        {columns.map((column) => (
          <th
            key={column.id}
            {...tableRoles.header}
            scope="col"
            aria-sort={sortWord(column, sorting)}
            className={classNames(
              'px-3 py-1.5 text-sm font-semibold text-ink-soft',
              column.align === 'right' ? 'text-right' : 'text-left',
            )}
          >
            {column.sortable === false ? (
              column.header
            ) : (
              <SortButton column={column} sorting={sorting} onSort={onSort} />
            )}
          </th>
        ))}
      </tr>
    </thead>
  );
}

function sortWord<Row>(column: Column<Row>, sorting: TableSorting | undefined) {
  if (column.sortable === false) return undefined;
  if (sorting?.id !== column.id) return 'none';
  return sorting.desc ? 'descending' : 'ascending';
}

interface SortButtonProps<Row> extends Omit<DataTableHeadProps<Row>, 'columns'> {
  column: Column<Row>;
}

function SortButton<Row>({ column, sorting, onSort }: SortButtonProps<Row>) {
  const sorted = sorting?.id === column.id;
  const Icon = sorted ? (sorting.desc ? ArrowDown : ArrowUp) : ChevronsUpDown;
  return (
    <button
      type="button"
      onClick={() => onSort(column.id, sorted && !sorting.desc)}
      className={classNames(
        '-mx-1.5 inline-flex min-h-8 items-center gap-1 rounded px-1.5 hover:bg-manila',
        sorted && 'text-ink',
      )}
    >
      {column.header}
      <Icon size={14} aria-hidden="true" className={sorted ? undefined : 'opacity-50'} />
    </button>
  );
}

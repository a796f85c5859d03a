import { Search, Sheet } from 'lucide-react';
import { useId } from 'react';
import type { Column } from './column.ts';
import { buttonLook } from './button-look.ts';
import type { TableSorting } from './data-table-head.tsx';

interface DataTableToolsProps<Row> {
  columns: readonly Column<Row>[];
  filterLabel: string | undefined;
  filter: string;
  onFilter: (text: string) => void;
  found: number;
  of: number;
  sorting: TableSorting | undefined;
  onSort: (id: string, desc: boolean) => void;
  sheetAddress: string | undefined;
}

/** Above the table: the filter, on a phone the order, and the way to a spreadsheet. */
export function DataTableTools<Row>(props: DataTableToolsProps<Row>) {
  const { filterLabel, filter, onFilter, found, of, sheetAddress } = props;
  if (filterLabel === undefined && sheetAddress === undefined) return null;
  return (
    <div className="no-print mb-3 flex flex-wrap items-center gap-x-4 gap-y-2">
      {filterLabel && (
        <div className="flex min-h-9 w-full items-center rounded border border-edge bg-card focus-within:outline-3 focus-within:outline-offset-2 focus-within:outline-verdigris sm:w-72">
          <Search size={16} aria-hidden="true" className="ml-3 shrink-0 text-ink-soft" />
          <input
            type="search"
            aria-label={filterLabel}
            placeholder={filterLabel}
            value={filter}
            onChange={(event) => onFilter(event.target.value)}
            className="min-w-0 grow bg-transparent px-2 py-1 outline-none"
          />
        </div>
      )}
      <OrderSelect {...props} />
      <span role="status" className="text-sm text-ink-soft">
        {filter === '' ? '' : `${found} of ${of}`}
      </span>
      {sheetAddress && (
        <a href={sheetAddress} download className={`${buttonLook({})} ml-auto`}>
          <Sheet size={16} aria-hidden="true" />
          Spreadsheet
        </a>
      )}
    </div>
  );
}

function OrderSelect<Row>({ columns, sorting, onSort }: DataTableToolsProps<Row>) {
  const id = useId();
  const sortable = columns.filter((column) => column.sortable !== false);
  return (
    <div className="flex items-center gap-2 lg:hidden">
      <label htmlFor={id} className="text-sm text-ink-soft">
        Order by
      </label>
      <select
        id={id}
        value={sorting ? `${sorting.id} ${sorting.desc}` : ''}
        onChange={(event) => {
          const [column = '', desc] = event.target.value.split(' ');
          if (column !== '') onSort(column, desc === 'true');
        }}
        className="min-h-9 rounded border border-edge bg-card px-2"
      >
        <option value="">as it is</option>
        {sortable.flatMap((column) => [
          <option key={`${column.id} up`} value={`${column.id} false`}>
            {column.header}
          </option>,
          <option key={`${column.id} down`} value={`${column.id} true`}>
            {column.header}, last first
          </option>,
        ])}
      </select>
    </div>
  );
}

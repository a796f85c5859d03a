import { useTable, type ColumnDef, type RowData } from '@tanstack/react-table';
import { useMemo, type ReactNode } from 'react';
import { classNames } from '../lib/class-names.ts';
import { tableRoles } from './table-roles.ts';
import type { Column } from './column.ts';
import { DataTableHead } from './data-table-head.tsx';
import { DataTableRow } from './data-table-row.tsx';
import { DataTableTools } from './data-table-tools.tsx';
import { features, type Features } from './table-features.ts';

interface DataTableProps<Row extends RowData> {
  /** What the rows are, for the ear: "Lots on the rack". */
  label: string;
  rows: readonly Row[];
  rowId: (row: Row) => string | number;
  /** At module level, or memoised. */
  columns: readonly Column<Row>[];
  /** Shown instead of the table while there are no rows at all: an EmptyState that says what to do first. */
  empty: ReactNode;
  /** "Filter lots"; without one there is no filter field. */
  filterLabel?: string | undefined;
  /** The column and direction to begin with. */
  sortedBy?: { id: string; desc?: boolean | undefined } | undefined;
  /** Where the list can be had as a spreadsheet. */
  sheetAddress?: string | undefined;
  /** Under the last row, such as a button for more. */
  after?: ReactNode | undefined;
}

/** A real table: sorted by its headers, filtered, added up; on a phone each row is a card. */
export function DataTable<Row extends RowData>(props: DataTableProps<Row>) {
  const { label, rows, columns, rowId, empty, filterLabel, sortedBy, sheetAddress, after } = props;
  const table = useTable<Features, Row>({
    features,
    data: rows,
    columns: useMemo(() => columns.map(definitionOf), [columns]),
    getRowId: (row) => String(rowId(row)),
    globalFilterFn: 'words',
    getColumnCanGlobalFilter: () => true,
    enableMultiSort: false,
    enableSortingRemoval: false,
    initialState: { sorting: sortedBy ? [{ id: sortedBy.id, desc: sortedBy.desc ?? false }] : [] },
  });
  if (rows.length === 0) return empty;

  const shown = table.getRowModel().rows;
  const sorting = table.state.sorting[0];
  const filter = String(table.state.globalFilter ?? '');
  const hasTotals = columns.some((column) => column.total);
  return (
    <div>
      <DataTableTools
        columns={columns}
        filterLabel={filterLabel}
        filter={filter}
        onFilter={(text) => table.setGlobalFilter(text)}
        found={shown.length}
        of={rows.length}
        sorting={sorting}
        onSort={(id, desc) => table.setSorting([{ id, desc }])}
        sheetAddress={sheetAddress}
      />
      <table {...tableRoles.table} aria-label={label} className="block w-full lg:table">
        <DataTableHead
          columns={columns}
          sorting={sorting}
          onSort={(id, desc) => table.setSorting([{ id, desc }])}
        />
        <tbody {...tableRoles.group} className="block space-y-2 lg:table-row-group">
          {shown.map((row) => (
            <DataTableRow key={row.id} columns={columns} row={row.original} />
          ))}
        </tbody>
        {hasTotals && (
          <tfoot {...tableRoles.group} className="mt-2 block lg:table-footer-group">
            <TotalsRow columns={columns} rows={shown.map((row) => row.original)} />
          </tfoot>
        )}
      </table>
      {shown.length === 0 && (
        <p className="py-6 text-center text-ink-soft">Nothing here matches “{filter}”.</p>
      )}
      {after}
    </div>
  );
}

function definitionOf<Row extends RowData>(column: Column<Row>): ColumnDef<Features, Row> {
  return {
    id: column.id,
    accessorFn: (row) => column.value(row),
    header: column.header,
    sortFn: 'values',
    enableSorting: column.sortable !== false,
  };
}

function TotalsRow<Row>({
  columns,
  rows,
}: {
  columns: readonly Column<Row>[];
  rows: readonly Row[];
}) {
  const first = columns.findIndex((column) => column.total);
  return (
    <tr
      {...tableRoles.row}
      className="block border-t-2 border-edge px-3 py-2 font-bold lg:table-row lg:px-0"
    >
      {columns.map((column, index) => (
        <td
          key={column.id}
          {...tableRoles.cell}
          className={classNames(
            'lg:table-cell lg:px-3 lg:py-2',
            column.align === 'right' && 'lg:text-right',
            column.total || index === 0 ? 'flex justify-between gap-4' : 'hidden',
          )}
        >
          {index === 0 && first !== 0 ? 'Total' : null}
          {column.total && (
            <>
              <span className="font-normal text-ink-soft lg:hidden">{column.header}</span>
              {column.total(rows)}
            </>
          )}
        </td>
      ))}
    </tr>
  );
}

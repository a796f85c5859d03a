import { classNames } from '../lib/class-names.ts';
import { tableRoles } from './table-roles.ts';
import type { Column } from './column.ts';

/** A row; on a phone a card, whose lines carry the column's name. */
export function DataTableRow<Row>({ columns, row }: { columns: readonly Column<Row>[]; row: Row }) {
  return (
    <tr
      {...tableRoles.row}
      className="block rounded border border-stitch bg-card px-3 py-2 md:table-row md:border-0 md:hover:bg-manila/40 md:[&>td]:border-b md:[&>td]:border-stitch/60 [&_a]:inline-block [&_a]:py-0.5"
    >
      {columns.map((column) => (
        <td key={column.id} {...tableRoles.cell} className={cellLook(column, row)}>
          {column.onPhone !== 'title' && column.header !== '' && (
            <span aria-hidden="true" className="shrink-0 text-sm text-ink-soft md:hidden">
              {column.header}
            </span>
          )}
          <span className="min-w-0 text-right wrap-anywhere md:contents md:[text-align:inherit]">
            {column.cell ? column.cell(row) : column.value(row)}
          </span>
        </td>
      ))}
    </tr>
  );
}

function cellLook<Row>(column: Column<Row>, row: Row): string {
  const figures = column.align === 'right' && 'md:text-right whitespace-nowrap';
  const says = column.cell !== undefined || (column.value(row) ?? '') !== '';
  // A card leaves out what a row leaves blank.
  if (column.onPhone === 'hidden' || !says)
    return classNames('hidden md:table-cell md:px-3 md:py-2.5', figures);
  return classNames(
    'flex items-baseline justify-between gap-4 py-0.5 md:table-cell md:px-3 md:py-2.5',
    column.onPhone === 'title' && 'font-semibold md:font-normal',
    figures,
  );
}

import { classNames } from '../lib/class-names.ts';
import { tableRoles } from './table-roles.ts';
import type { Column } from './column.ts';

/** A row; on a phone a card, whose lines carry the column's name. */
export function DataTableRow<Row>({ columns, row }: { columns: readonly Column<Row>[]; row: Row }) {
  return (
    <tr
      {...tableRoles.row}
      className="block rounded border border-stitch bg-card px-3 py-2 lg:table-row lg:border-0 lg:hover:bg-manila/40 lg:[&>td]:border-b lg:[&>td]:border-stitch/60 [&_a]:inline-block [&_a]:py-0.5"
    >
      {columns.map((column) => (
        <td key={column.id} {...tableRoles.cell} className={cellLook(column, row)}>
          {column.onPhone !== 'title' && column.header !== '' && (
            <span aria-hidden="true" className="shrink-0 text-sm text-ink-soft lg:hidden">
              {column.header}
            </span>
          )}
          <span className="min-w-0 text-right wrap-anywhere lg:contents lg:[text-align:inherit]">
            {column.cell ? column.cell(row) : column.value(row)}
          </span>
        </td>
      ))}
    </tr>
  );
}

/** A word such as received or P-0012 is never broken, however narrow its column. */
const isShortWord = (value: unknown) => typeof value === 'string' && /^\S{1,14}$/.test(value);

function cellLook<Row>(column: Column<Row>, row: Row): string {
  const value = column.value(row);
  const figures = classNames(
    column.align === 'right' && 'lg:text-right whitespace-nowrap',
    isShortWord(value) && 'whitespace-nowrap',
  );
  const says = column.cell !== undefined || (value ?? '') !== '';
  // A card leaves out what a row leaves blank.
  if (column.onPhone === 'hidden' || !says)
    return classNames('hidden lg:table-cell lg:px-3 lg:py-2.5', figures);
  return classNames(
    'flex items-baseline justify-between gap-4 py-0.5 lg:table-cell lg:px-3 lg:py-2.5',
    column.onPhone === 'title' && 'font-semibold lg:font-normal',
    figures,
  );
}

import type { QuoteRow } from '@hidewright/contract';
import { useMemo, type ReactNode } from 'react';
import type { Column } from '../../../components/column.ts';
import { DataTable } from '../../../components/data-table.tsx';
import { StateMark } from '../../../components/state-mark.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { countText, dayText, moneyText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';

interface QuotesTableProps {
  rows: readonly QuoteRow[];
  /** On a customer's own page the customer goes without saying. */
  withoutCustomer?: boolean;
  empty: ReactNode;
  after?: ReactNode;
}

export function QuotesTable({ rows, withoutCustomer = false, empty, after }: QuotesTableProps) {
  const { today } = useWorkshop();
  const withoutTotal = rows.every((row) => row.total === undefined);
  const columns = useMemo(() => {
    const left = [withoutCustomer && 'customer', withoutTotal && 'total'];
    return columnsFor(today).filter((column) => !left.includes(column.id));
  }, [today, withoutCustomer, withoutTotal]);
  return (
    <DataTable
      label="Quotes"
      rows={rows}
      rowId={(row) => row.id}
      columns={columns}
      empty={empty}
      after={after}
      filterLabel="Filter quotes"
      sortedBy={{ id: 'number', desc: true }}
    />
  );
}

function columnsFor(today: string): Column<QuoteRow>[] {
  return [
    {
      id: 'number',
      header: 'Quote',
      value: (row) => `${row.number} ${String(row.revision).padStart(3, '0')}`,
      cell: (row) => <TextLink to={`/counter/quotes/${row.id}`}>{nameOf(row)}</TextLink>,
      onPhone: 'title',
    },
    { id: 'customer', header: 'Customer', value: (row) => row.customerName },
    { id: 'title', header: 'For', value: (row) => row.title },
    {
      id: 'state',
      header: 'State',
      value: (row) => row.state,
      cell: (row) => <StateMark state={row.state} />,
    },
    {
      id: 'hands',
      header: 'In hands',
      value: (row) => row.inHandsOn ?? '',
      cell: (row) => (row.inHandsOn === null ? '' : dayText(row.inHandsOn, today)),
    },
    {
      id: 'pieces',
      header: 'Pieces',
      align: 'right',
      value: (row) => row.agreedQuantity ?? row.quantities.at(-1),
      cell: (row) => piecesOf(row),
    },
    {
      id: 'total',
      header: 'Total',
      align: 'right',
      value: (row) => row.total,
      cell: (row) => (row.total === undefined ? '' : moneyText(row.total)),
    },
  ];
}

const nameOf = (row: QuoteRow) =>
  row.revision === 1 ? row.number : `${row.number}, revision ${row.revision}`;

/** What was agreed, or the range that is offered. */
function piecesOf({ agreedQuantity, quantities }: QuoteRow): string {
  if (agreedQuantity !== null) return countText(agreedQuantity);
  const [least, most] = [quantities[0] ?? 0, quantities.at(-1) ?? 0];
  return least === most ? countText(least) : `${countText(least)} to ${countText(most)}`;
}

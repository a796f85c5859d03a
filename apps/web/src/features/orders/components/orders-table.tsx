import type { Order } from '@hidewright/contract';
import { useMemo, type ReactNode } from 'react';
import type { Column } from '../../../components/column.ts';
import { DataTable } from '../../../components/data-table.tsx';
import { StateMark } from '../../../components/state-mark.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { countText, dayText, moneyText } from '../../../lib/formatting.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';

interface OrdersTableProps {
  rows: readonly Order[];
  empty: ReactNode;
  after?: ReactNode;
}

export function OrdersTable({ rows, empty, after }: OrdersTableProps) {
  const { today } = useWorkshop();
  const columns = useMemo(() => columnsFor(today), [today]);
  return (
    <DataTable
      label="Orders"
      rows={rows}
      rowId={(row) => row.id}
      columns={columns}
      empty={empty}
      after={after}
      filterLabel="Filter orders"
      sortedBy={{ id: 'number', desc: true }}
    />
  );
}

const isLate = (row: Order, today: string) =>
  row.promisedOn < today && !['shipped', 'closed', 'cancelled', 'packed'].includes(row.state);

function columnsFor(today: string): Column<Order>[] {
  return [
    {
      id: 'number',
      header: 'Order',
      value: (row) => row.number,
      cell: (row) => <TextLink to={`/counter/orders/${row.id}`}>{row.number}</TextLink>,
      onPhone: 'title',
    },
    { id: 'customer', header: 'Customer', value: (row) => row.customerName },
    { id: 'title', header: 'For', value: (row) => row.title },
    {
      id: 'state',
      header: 'State',
      value: (row) => row.state,
      cell: (row) => (
        <span className="inline-flex flex-wrap justify-end gap-1.5 lg:justify-start">
          {row.awaits.length > 0 ? (
            row.awaits.map((what) => <StateMark key={what} state={`awaiting ${what}`} />)
          ) : (
            <StateMark state={row.state} />
          )}
          {isLate(row, today) && <StateMark state="late" />}
        </span>
      ),
    },
    {
      id: 'promised',
      header: 'Promised',
      value: (row) => row.promisedOn,
      cell: (row) => dayText(row.promisedOn, today),
    },
    {
      id: 'pieces',
      header: 'Pieces',
      align: 'right',
      value: (row) => row.quantity,
      cell: (row) => countText(row.quantity),
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

import type { PurchaseOrder } from '@hidewright/contract';
import { useMemo, type ReactNode } from 'react';
import type { Column } from '../../../components/column.ts';
import { DataTable } from '../../../components/data-table.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { dayText, moneyText } from '../../../lib/formatting.ts';
import { useWorkshop, type Workshop } from '../../../lib/workshop.tsx';
import { OrderState } from './order-state.tsx';

const whatOf = (order: PurchaseOrder) => order.lines.map((line) => line.name).join(', ');

const expectedOf = ({ awaitedOn, arrivesOn, expectedOn }: PurchaseOrder) =>
  awaitedOn ?? arrivesOn ?? expectedOn;

interface Shown {
  supplier: boolean;
  prices: boolean;
}

function columnsFor({ currency, today }: Workshop, shown: Shown): Column<PurchaseOrder>[] {
  const total: Column<PurchaseOrder> = {
    id: 'total',
    header: `Total, ${currency}`,
    value: (row) => row.total,
    cell: (row) => row.total !== undefined && moneyText(row.total),
    align: 'right',
  };
  const supplier: Column<PurchaseOrder> = {
    id: 'supplier',
    header: 'Supplier',
    value: (row) => row.supplierName,
  };
  return [
    {
      id: 'number',
      header: 'Order',
      value: (row) => row.number,
      cell: (row) => <TextLink to={`/stockroom/purchase-orders/${row.id}`}>{row.number}</TextLink>,
      onPhone: 'title',
    },
    ...(shown.supplier ? [supplier] : []),
    { id: 'what', header: 'What', value: whatOf },
    {
      id: 'state',
      header: 'State',
      value: (row) => row.state,
      cell: (row) => <OrderState order={row} />,
    },
    {
      id: 'expected',
      header: 'Expected',
      value: expectedOf,
      cell: (row) => expectedOf(row) && dayText(expectedOf(row) ?? '', today),
    },
    ...(shown.prices ? [total] : []),
  ];
}

interface PurchaseOrdersTableProps {
  rows: readonly PurchaseOrder[];
  /** They all went to the supplier whose page it is. */
  toOneSupplier?: boolean;
  empty: ReactNode;
  after?: ReactNode;
}

export function PurchaseOrdersTable({
  rows,
  toOneSupplier = false,
  empty,
  after,
}: PurchaseOrdersTableProps) {
  const workshop = useWorkshop();
  const prices = rows.some((row) => row.total !== undefined);
  const columns = useMemo(
    () => columnsFor(workshop, { supplier: !toOneSupplier, prices }),
    [workshop, toOneSupplier, prices],
  );
  return (
    <DataTable
      label="Purchase orders"
      rows={rows}
      rowId={(row) => row.id}
      columns={columns}
      empty={empty}
      filterLabel="Filter purchase orders"
      after={after}
    />
  );
}

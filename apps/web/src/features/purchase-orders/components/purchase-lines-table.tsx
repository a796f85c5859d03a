import type { PurchaseLine, PurchaseOrder } from '@hidewright/contract';
import { useMemo } from 'react';
import type { Column } from '../../../components/column.ts';
import { DataTable } from '../../../components/data-table.tsx';
import { EmptyState } from '../../../components/empty-state.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { areaText, countText, moneyText, unitPriceText } from '../../../lib/formatting.ts';
import { useWorkshop, type Workshop } from '../../../lib/workshop.tsx';

const placeOf = (line: PurchaseLine) =>
  line.of === 'leather'
    ? `/stockroom/leather/${line.leatherId}`
    : `/stockroom/hardware/${line.hardwareId}`;

function columnsFor(
  { areaUnit, currency }: Workshop,
  total: string | undefined,
): Column<PurchaseLine>[] {
  const quantity = (area: string | null, pieces: number | null) =>
    area === null ? countText(pieces ?? 0) : areaText(area, areaUnit);
  const prices: Column<PurchaseLine>[] = [
    {
      id: 'price',
      header: `Price, ${currency}`,
      value: (row) => row.unitPrice,
      cell: (row) =>
        row.unitPrice !== undefined &&
        `${unitPriceText(row.unitPrice)} ${row.of === 'leather' ? 'per ft²' : 'each'}`,
      align: 'right',
    },
    {
      id: 'amount',
      header: `Amount, ${currency}`,
      value: (row) => row.amount,
      cell: (row) => row.amount !== undefined && moneyText(row.amount),
      align: 'right',
      total: () => moneyText(total ?? '0'),
    },
  ];
  return [
    {
      id: 'name',
      header: 'What',
      value: (row) => row.name,
      cell: (row) => <TextLink to={placeOf(row)}>{row.name}</TextLink>,
      onPhone: 'title',
    },
    {
      id: 'ordered',
      header: 'Ordered',
      value: (row) => row.areaMm2 ?? row.quantity,
      cell: (row) => quantity(row.areaMm2, row.quantity),
      align: 'right',
    },
    {
      id: 'received',
      header: 'Received',
      value: (row) => row.receivedAreaMm2 ?? row.received,
      cell: (row) => quantity(row.receivedAreaMm2, row.received),
      align: 'right',
    },
    ...(total === undefined ? [] : prices),
  ];
}

export function PurchaseLinesTable({ order }: { order: PurchaseOrder }) {
  const workshop = useWorkshop();
  const columns = useMemo(() => columnsFor(workshop, order.total), [workshop, order.total]);
  return (
    <DataTable
      label={`Lines of ${order.number}`}
      rows={order.lines}
      rowId={(row) => row.id}
      columns={columns}
      empty={<EmptyState title="Nothing is ordered yet." />}
    />
  );
}

import type { Receipt, StockMovement } from '@hidewright/contract';
import { useQuery } from '@tanstack/react-query';
import { useMemo, useState } from 'react';
import { Button } from '../../../components/button.tsx';
import { Card } from '../../../components/card.tsx';
import type { Column } from '../../../components/column.ts';
import { DataTable } from '../../../components/data-table.tsx';
import { instantText, moneyText } from '../../../lib/formatting.ts';
import { useWorkshop, type Workshop } from '../../../lib/workshop.tsx';
import { goodsText } from '../goods-text.ts';
import { supplierReturnsQuery } from '../purchase-orders.queries.ts';
import { ReturnDialog } from './return-dialog.tsx';

const less = (row: StockMovement) => ({
  areaMm2: row.areaMm2?.replace('-', '') ?? null,
  quantity: row.quantity === null ? null : -row.quantity,
});

function columnsFor(workshop: Workshop, withValues: boolean): Column<StockMovement>[] {
  const { currency, timeZone } = workshop;
  const value: Column<StockMovement> = {
    id: 'value',
    header: `At cost, ${currency}`,
    value: (row) => row.value,
    cell: (row) => row.value !== undefined && moneyText(row.value.replace('-', '')),
    align: 'right',
  };
  return [
    {
      id: 'what',
      header: 'What',
      value: (row) => row.lotTag ?? row.hardwareName,
      onPhone: 'title',
    },
    {
      id: 'quantity',
      header: 'How much',
      value: (row) => row.areaMm2 ?? row.quantity,
      cell: (row) => goodsText(less(row), workshop),
      align: 'right',
    },
    ...(withValues ? [value] : []),
    { id: 'reason', header: 'Why', value: (row) => row.reason },
    {
      id: 'at',
      header: 'When',
      value: (row) => row.at,
      cell: (row) => instantText(row.at, timeZone),
    },
    { id: 'by', header: 'By', value: (row) => row.actorName },
  ];
}

interface ReturnsCardProps {
  orderId: number;
  receipts: readonly Receipt[];
  isOwner: boolean;
}

/** What of an order went back to its supplier; once something has come, the owner may send more back. */
export function ReturnsCard({ orderId, receipts, isOwner }: ReturnsCardProps) {
  const workshop = useWorkshop();
  const [asking, setAsking] = useState(false);
  const { data } = useQuery(supplierReturnsQuery(orderId));
  const rows = data?.items ?? [];
  const withValues = rows.some((row) => row.value !== undefined);
  const columns = useMemo(() => columnsFor(workshop, withValues), [workshop, withValues]);
  if (receipts.length === 0 || (!isOwner && rows.length === 0)) return null;
  return (
    <Card
      title="Sent back"
      aside={isOwner && <Button onClick={() => setAsking(true)}>Send something back</Button>}
    >
      {rows.length === 0 ? (
        <p className="text-ink-soft">Nothing of it went back to the supplier.</p>
      ) : (
        <DataTable
          label="What went back to the supplier"
          rows={rows}
          rowId={(row) => row.id}
          columns={columns}
          empty={null}
        />
      )}
      {asking && (
        <ReturnDialog orderId={orderId} receipts={receipts} onClose={() => setAsking(false)} />
      )}
    </Card>
  );
}

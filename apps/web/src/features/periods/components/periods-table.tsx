import type { Period } from '@hidewright/contract';
import { useMemo } from 'react';
import { Card } from '../../../components/card.tsx';
import type { Column } from '../../../components/column.ts';
import { DataTable } from '../../../components/data-table.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { instantText, moneyText } from '../../../lib/formatting.ts';
import { useWorkshop, type Workshop } from '../../../lib/workshop.tsx';
import { periodText } from '../period-text.ts';

function columnsFor({ currency, timeZone }: Workshop): Column<Period>[] {
  return [
    {
      id: 'days',
      header: 'Days',
      value: (row) => row.fromDay,
      cell: (row) => (
        <TextLink to={`/books/sales-sheets?from=${row.fromDay}&to=${row.toDay}`}>
          {periodText(row)}
        </TextLink>
      ),
      onPhone: 'title',
    },
    {
      id: 'locked',
      header: 'Locked',
      value: (row) => row.lockedAt,
      cell: (row) => `${instantText(row.lockedAt, timeZone)}, ${row.lockedBy}`,
    },
    {
      id: 'total',
      header: `Total, ${currency}`,
      value: (row) => row.totals.total,
      cell: (row) => moneyText(row.totals.total),
      align: 'right',
    },
    {
      id: 'received',
      header: 'Received',
      value: (row) => row.totals.received,
      cell: (row) => moneyText(row.totals.received),
      align: 'right',
    },
  ];
}

export function PeriodsTable({ rows }: { rows: readonly Period[] }) {
  const workshop = useWorkshop();
  const columns = useMemo(() => columnsFor(workshop), [workshop]);
  return (
    <Card title="Locked so far">
      <DataTable
        label="Locked periods"
        rows={rows}
        rowId={(row) => row.id}
        columns={columns}
        empty={<p className="text-ink-soft">No days are locked yet.</p>}
      />
    </Card>
  );
}

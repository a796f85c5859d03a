import type { TaxRate } from '@hidewright/contract';
import { useMemo, useState, type ReactNode } from 'react';
import { Button } from '../../../components/button.tsx';
import type { Column } from '../../../components/column.ts';
import { DataTable } from '../../../components/data-table.tsx';
import { StateMark } from '../../../components/state-mark.tsx';
import { percentText } from '../../../lib/formatting.ts';
import { ChangeTaxRateDialog } from './change-tax-rate-dialog.tsx';

function columnsFor(onChange: (rate: TaxRate) => void): Column<TaxRate>[] {
  return [
    { id: 'name', header: 'Tax', value: (row) => row.name, onPhone: 'title' },
    {
      id: 'percent',
      header: 'Rate',
      value: (row) => row.percent,
      cell: (row) => percentText(row.percent, 4),
      align: 'right',
    },
    {
      id: 'standing',
      header: 'Standing',
      value: (row) => (row.active ? 'in use' : 'retired'),
      cell: (row) =>
        row.active ? <StateMark state="in use" /> : <StateMark state="put away">retired</StateMark>,
    },
    {
      id: 'change',
      header: 'Change',
      value: () => null,
      cell: (row) => (
        <Button onClick={() => onChange(row)}>
          Change<span className="sr-only"> {row.name}</span>
        </Button>
      ),
      sortable: false,
    },
  ];
}

export function TaxRatesTable({ rows, empty }: { rows: readonly TaxRate[]; empty: ReactNode }) {
  const [changing, setChanging] = useState<TaxRate>();
  const columns = useMemo(() => columnsFor(setChanging), []);
  return (
    <>
      <DataTable
        label="Tax rates"
        rows={rows}
        rowId={(row) => row.id}
        columns={columns}
        empty={empty}
        sortedBy={{ id: 'name' }}
      />
      {changing && (
        <ChangeTaxRateDialog
          key={changing.id}
          rate={changing}
          open
          onOpenChange={() => setChanging(undefined)}
        />
      )}
    </>
  );
}

import type { TaxRate } from '@hidewright/contract';
import type { ReactNode } from 'react';
import type { Column } from '../../../components/column.ts';
import { NamedTable } from '../../../components/named-table.tsx';
import { StateMark } from '../../../components/state-mark.tsx';
import { percentText } from '../../../lib/formatting.ts';
import { ChangeTaxRateDialog } from './change-tax-rate-dialog.tsx';

const columns: Column<TaxRate>[] = [
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
];

export function TaxRatesTable({ rows, empty }: { rows: readonly TaxRate[]; empty: ReactNode }) {
  return (
    <NamedTable
      label="Tax rates"
      rows={rows}
      columns={columns}
      empty={empty}
      changing={(rate, close) => <ChangeTaxRateDialog key={rate.id} rate={rate} onClose={close} />}
    />
  );
}

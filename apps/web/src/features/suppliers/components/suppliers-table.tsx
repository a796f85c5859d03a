import type { Supplier } from '@hidewright/contract';
import type { ReactNode } from 'react';
import type { Column } from '../../../components/column.ts';
import { DataTable } from '../../../components/data-table.tsx';
import { TextLink } from '../../../components/text-link.tsx';

const columns: Column<Supplier>[] = [
  {
    id: 'name',
    header: 'Supplier',
    value: (row) => row.name,
    cell: (row) => <TextLink to={`/stockroom/suppliers/${row.id}`}>{row.name}</TextLink>,
    onPhone: 'title',
  },
  { id: 'email', header: 'E-mail address', value: (row) => row.email },
  { id: 'phone', header: 'Phone', value: (row) => row.phone },
  {
    id: 'lead',
    header: 'Days to deliver',
    value: (row) => row.leadDays,
    align: 'right',
  },
  {
    id: 'standing',
    header: 'Standing',
    value: (row) => (row.active ? 'current' : 'put away'),
    onPhone: 'hidden',
  },
];

export function SuppliersTable({ rows, empty }: { rows: readonly Supplier[]; empty: ReactNode }) {
  return (
    <DataTable
      label="Suppliers"
      rows={rows}
      rowId={(row) => row.id}
      columns={columns}
      empty={empty}
      filterLabel="Filter suppliers"
      sortedBy={{ id: 'name' }}
    />
  );
}

import type { Customer } from '@hidewright/contract';
import type { ReactNode } from 'react';
import type { Column } from '../../../components/column.ts';
import { DataTable } from '../../../components/data-table.tsx';
import { TextLink } from '../../../components/text-link.tsx';

const columns: Column<Customer>[] = [
  {
    id: 'name',
    header: 'Customer',
    value: (row) => row.name,
    cell: (row) => <TextLink to={`/counter/customers/${row.id}`}>{row.name}</TextLink>,
    onPhone: 'title',
  },
  { id: 'contact', header: 'Who we talk to', value: (row) => row.contactName },
  { id: 'email', header: 'E-mail address', value: (row) => row.email },
  { id: 'phone', header: 'Phone', value: (row) => row.phone },
  {
    id: 'standing',
    header: 'Standing',
    value: (row) => (row.active ? 'current' : 'put away'),
    onPhone: 'hidden',
  },
];

export function CustomersTable({ rows, empty }: { rows: readonly Customer[]; empty: ReactNode }) {
  return (
    <DataTable
      label="Customers"
      rows={rows}
      rowId={(row) => row.id}
      columns={columns}
      empty={empty}
      filterLabel="Filter customers"
      sortedBy={{ id: 'name' }}
    />
  );
}

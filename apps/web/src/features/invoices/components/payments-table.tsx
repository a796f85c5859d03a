import type { Payment } from '@hidewright/contract';
import { useMemo, type ReactNode } from 'react';
import type { Column } from '../../../components/column.ts';
import { DataTable } from '../../../components/data-table.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { dayText, moneyText } from '../../../lib/formatting.ts';
import { useWorkshop, type Workshop } from '../../../lib/workshop.tsx';
import { sumMoney } from '../../../lib/sum-money.ts';

function columnsFor({ currency, today }: Workshop, ofOneInvoice: boolean): Column<Payment>[] {
  const invoice: Column<Payment>[] = [
    {
      id: 'invoice',
      header: 'Invoice',
      value: (row) => row.invoiceNumber,
      cell: (row) => (
        <TextLink to={`/books/invoices/${row.invoiceId}`}>{row.invoiceNumber}</TextLink>
      ),
    },
    { id: 'customer', header: 'Customer', value: (row) => row.customerName },
  ];
  return [
    {
      id: 'received',
      header: 'Received',
      value: (row) => row.receivedOn,
      cell: (row) => dayText(row.receivedOn, today),
      onPhone: 'title',
    },
    ...(ofOneInvoice ? [] : invoice),
    { id: 'how', header: 'How', value: (row) => row.method },
    { id: 'note', header: 'Note', value: (row) => row.note },
    { id: 'by', header: 'Recorded by', value: (row) => row.recordedBy },
    {
      id: 'amount',
      header: `Amount, ${currency}`,
      value: (row) => row.amount,
      cell: (row) => moneyText(row.amount),
      align: 'right',
      total: (rows) => sumMoney(rows.map((row) => row.amount)),
    },
  ];
}

interface PaymentsTableProps {
  rows: readonly Payment[];
  ofOneInvoice?: boolean | undefined;
  empty: ReactNode;
  after?: ReactNode;
}

export function PaymentsTable({ rows, ofOneInvoice = false, empty, after }: PaymentsTableProps) {
  const workshop = useWorkshop();
  const columns = useMemo(() => columnsFor(workshop, ofOneInvoice), [workshop, ofOneInvoice]);
  return (
    <DataTable
      label="Payments"
      rows={rows}
      rowId={(row) => row.id}
      columns={columns}
      empty={empty}
      filterLabel={ofOneInvoice ? undefined : 'Filter payments'}
      after={after}
    />
  );
}

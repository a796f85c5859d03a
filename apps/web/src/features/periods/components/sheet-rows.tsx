import type { SalesSheet, SheetInvoice, SheetPayment } from '@hidewright/contract';
import { useMemo } from 'react';
import { Card } from '../../../components/card.tsx';
import type { Column } from '../../../components/column.ts';
import { DataTable } from '../../../components/data-table.tsx';
import { dayText, moneyText } from '../../../lib/formatting.ts';
import { sumMoney } from '../../../lib/sum-money.ts';
import { useWorkshop } from '../../../lib/workshop.tsx';

function amountColumn<Row>(id: string, header: string, amount: (row: Row) => string): Column<Row> {
  return {
    id,
    header,
    value: amount,
    cell: (row) => moneyText(amount(row)),
    align: 'right',
    total: (rows) => sumMoney(rows.map(amount)),
  };
}

const invoiceColumns = (today: string): Column<SheetInvoice>[] => [
  { id: 'number', header: 'Invoice', value: (row) => row.number, onPhone: 'title' },
  {
    id: 'issued',
    header: 'Issued',
    value: (row) => row.issuedOn,
    cell: (row) => dayText(row.issuedOn, today),
  },
  { id: 'customer', header: 'Customer', value: (row) => row.customerName },
  {
    id: 'order',
    header: 'Order',
    value: (row) => row.orderNumber,
    cell: (row) => row.orderNumber ?? 'from the shelf',
  },
  amountColumn('net', 'Net', (row) => row.net),
  amountColumn('tax', 'Tax', (row) => row.tax),
  amountColumn('total', 'Total', (row) => row.total),
];

const paymentColumns = (today: string): Column<SheetPayment & { at: number }>[] => [
  {
    id: 'received',
    header: 'Received',
    value: (row) => row.receivedOn,
    cell: (row) => dayText(row.receivedOn, today),
    onPhone: 'title',
  },
  { id: 'invoice', header: 'Invoice', value: (row) => row.invoiceNumber },
  { id: 'customer', header: 'Customer', value: (row) => row.customerName },
  { id: 'how', header: 'How', value: (row) => row.method },
  amountColumn('amount', 'Amount', (row) => row.amount),
];

export function SheetInvoices({ sheet }: { sheet: SalesSheet }) {
  const { today } = useWorkshop();
  const columns = useMemo(() => invoiceColumns(today), [today]);
  return (
    <Card title="Invoices">
      <DataTable
        label="Invoices of these days"
        rows={sheet.invoices}
        rowId={(row) => row.number}
        columns={columns}
        empty={<p className="text-ink-soft">No invoice was issued on these days.</p>}
      />
    </Card>
  );
}

export function SheetPayments({ sheet }: { sheet: SalesSheet }) {
  const { today } = useWorkshop();
  const columns = useMemo(() => paymentColumns(today), [today]);
  const rows = useMemo(
    () => sheet.payments.map((payment, at) => ({ ...payment, at })),
    [sheet.payments],
  );
  return (
    <Card title="Payments">
      <DataTable
        label="Payments of these days"
        rows={rows}
        rowId={(row) => row.at}
        columns={columns}
        empty={<p className="text-ink-soft">No payment came in on these days.</p>}
      />
    </Card>
  );
}

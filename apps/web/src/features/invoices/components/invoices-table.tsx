import type { InvoiceSummary } from '@hidewright/contract';
import { useMemo, type ReactNode } from 'react';
import type { Column } from '../../../components/column.ts';
import { DataTable } from '../../../components/data-table.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { dayText, moneyText } from '../../../lib/formatting.ts';
import { useWorkshop, type Workshop } from '../../../lib/workshop.tsx';
import { InvoiceStateMark } from './invoice-state.tsx';
import { sumMoney } from '../../../lib/sum-money.ts';

const nameOf = ({ number, orderNumber }: InvoiceSummary) =>
  number ?? `draft ${orderNumber === null ? 'from the shelf' : `for ${orderNumber}`}`;

function columnsFor(
  { currency, today }: Workshop,
  ofOneCustomer: boolean,
): Column<InvoiceSummary>[] {
  const day = (text: string | null) => (text === null ? '–' : dayText(text, today));
  const due: Column<InvoiceSummary> = {
    id: 'due',
    header: 'Due',
    value: (row) => row.dueOn,
    cell: (row) => day(row.dueOn),
  };
  const customer: Column<InvoiceSummary> = {
    id: 'customer',
    header: 'Customer',
    value: (row) => row.customerName,
  };
  return [
    {
      id: 'number',
      header: 'Invoice',
      value: nameOf,
      cell: (row) => <TextLink to={`/books/invoices/${row.id}`}>{nameOf(row)}</TextLink>,
      onPhone: 'title',
    },
    ...(ofOneCustomer ? [] : [customer]),
    { id: 'title', header: 'For', value: (row) => row.title },
    {
      id: 'state',
      header: 'State',
      value: (row) => row.state,
      cell: (row) => <InvoiceStateMark invoice={row} />,
    },
    {
      id: 'issued',
      header: 'Issued',
      value: (row) => row.issuedOn,
      cell: (row) => day(row.issuedOn),
    },
    ...(ofOneCustomer ? [] : [due]),
    {
      id: 'total',
      header: `Total, ${currency}`,
      value: (row) => row.total,
      cell: (row) => moneyText(row.total),
      align: 'right',
      total: (rows) => sumMoney(rows.map((row) => row.total)),
    },
    {
      id: 'open',
      header: 'Open',
      value: (row) => row.open,
      cell: (row) => moneyText(row.open),
      align: 'right',
      total: (rows) => sumMoney(rows.filter((row) => row.state !== 'draft').map((row) => row.open)),
    },
  ];
}

interface InvoicesTableProps {
  rows: readonly InvoiceSummary[];
  ofOneCustomer?: boolean | undefined;
  empty: ReactNode;
  after?: ReactNode;
}

export function InvoicesTable({ rows, ofOneCustomer = false, empty, after }: InvoicesTableProps) {
  const workshop = useWorkshop();
  const columns = useMemo(() => columnsFor(workshop, ofOneCustomer), [workshop, ofOneCustomer]);
  return (
    <DataTable
      label="Invoices"
      rows={rows}
      rowId={(row) => row.id}
      columns={columns}
      empty={empty}
      filterLabel={ofOneCustomer ? undefined : 'Filter invoices'}
      after={after}
    />
  );
}

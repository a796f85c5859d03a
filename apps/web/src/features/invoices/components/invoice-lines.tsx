import type { Invoice, InvoiceLine } from '@hidewright/contract';
import { useMemo, useState, type ReactNode } from 'react';
import { Button } from '../../../components/button.tsx';
import { Card } from '../../../components/card.tsx';
import type { Column } from '../../../components/column.ts';
import { DataTable } from '../../../components/data-table.tsx';
import { Stitch } from '../../../components/stitch.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { countText, moneyText, percentText, unitPriceText } from '../../../lib/formatting.ts';
import { PutBackDialog } from './put-back-dialog.tsx';

const columns: Column<InvoiceLine>[] = [
  {
    id: 'for',
    header: 'For',
    value: (row) => row.description,
    cell: (row) => <WhatFor line={row} />,
    onPhone: 'title',
    sortable: false,
  },
  {
    id: 'quantity',
    header: 'Quantity',
    value: (row) => row.quantity,
    cell: (row) => countText(row.quantity),
    align: 'right',
    sortable: false,
  },
  {
    id: 'each',
    header: 'Each',
    value: (row) => row.unitPrice,
    cell: (row) => unitPriceText(row.unitPrice),
    align: 'right',
    sortable: false,
  },
  {
    id: 'tax',
    header: 'Tax',
    value: (row) => row.taxPercent,
    cell: (row) => taxOf(row),
    sortable: false,
  },
  {
    id: 'amount',
    header: 'Amount',
    value: (row) => row.amount,
    cell: (row) => moneyText(row.amount),
    align: 'right',
    sortable: false,
  },
];

const taxOf = ({ taxName, taxPercent }: InvoiceLine) =>
  taxPercent === null ? 'no tax' : `${taxName ?? 'tax'} ${percentText(taxPercent, 4)}`;

/** What was sold from the shelf leads to where it lay. */
function WhatFor({ line: { description, finishedPieceId } }: { line: InvoiceLine }) {
  return finishedPieceId === null ? (
    description
  ) : (
    <TextLink to={`/stockroom/finished/${finishedPieceId}`}>{description}</TextLink>
  );
}

const putBackColumn = (onPutBack: (line: InvoiceLine) => void): Column<InvoiceLine> => ({
  id: 'put-back',
  header: 'Not wanted',
  value: () => '',
  cell: (row) => (
    <Button onClick={() => onPutBack(row)}>
      Put back<span className="sr-only"> {row.description}</span>
    </Button>
  ),
  align: 'right',
  sortable: false,
});

/** The lines, and below them net, tax by rate and total. */
export function InvoiceLines({ invoice, aside }: { invoice: Invoice; aside?: ReactNode }) {
  const [goes, setGoes] = useState<InvoiceLine>();
  // The last line of a draft goes with the draft.
  const canLose = invoice.state === 'draft' && invoice.orderId === null && invoice.lines.length > 1;
  const shown = useMemo(
    () => (canLose ? [...columns, putBackColumn(setGoes)] : columns),
    [canLose],
  );
  return (
    <Card title="Lines" aside={aside}>
      <DataTable
        label="Lines"
        rows={invoice.lines}
        rowId={(row) => row.position}
        columns={shown}
        empty={null}
      />
      {goes && <PutBackDialog invoice={invoice} line={goes} onClose={() => setGoes(undefined)} />}
      <Stitch className="my-3" />
      <dl className="ml-auto grid max-w-md grid-cols-[1fr_auto] gap-x-6 gap-y-1 px-3 text-right">
        <Sum word="Net" amount={invoice.net} />
        {invoice.taxes.map(({ percent, net, tax }) => (
          <Sum
            key={percent}
            word={`Tax ${percentText(percent, 4)} on ${moneyText(net)}`}
            amount={tax}
          />
        ))}
        {invoice.taxes.length === 0 && <Sum word="No tax" amount="0" />}
        <Sum word={`Total, ${invoice.currency}`} amount={invoice.total} strong />
      </dl>
    </Card>
  );
}

function Sum({ word, amount, strong }: { word: string; amount: string; strong?: boolean }) {
  const look = strong ? 'text-lg font-bold' : '';
  return (
    <>
      <dt className={strong ? look : 'text-ink-soft'}>{word}</dt>
      <dd className={look}>{moneyText(amount)}</dd>
    </>
  );
}

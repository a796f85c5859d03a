import type { Receipt, ReceiptLine } from '@hidewright/contract';
import { useMemo } from 'react';
import type { Column } from '../../../components/column.ts';
import { DataTable } from '../../../components/data-table.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { rackAreaText, moneyText, percentText } from '../../../lib/formatting.ts';
import { sumMoney } from '../../../lib/sum-money.ts';
import { useWorkshop, type Workshop } from '../../../lib/workshop.tsx';
import { goodsText } from '../goods-text.ts';

function NameOf({ line }: { line: ReceiptLine }) {
  if (line.lotId === null)
    return <TextLink to={`/stockroom/hardware/${line.hardwareId}`}>{line.name}</TextLink>;
  return (
    <span className="block text-left">
      <TextLink to={`/stockroom/lots/${line.lotId}`}>{line.lotTag}</TextLink>
      <span className="block text-sm font-normal text-ink-soft">{line.name}</span>
    </span>
  );
}

function MarkedOf({
  line: { marked, claimId },
  workshop,
}: {
  line: ReceiptLine;
  workshop: Workshop;
}) {
  if (marked === null) return '–';
  const sign = marked.differencePercent.startsWith('-') ? '' : '+';
  const claimed = claimId === null ? '' : ', claimed';
  return (
    <>
      {rackAreaText(marked.areaMm2, workshop)}
      <span className={marked.short ? 'block font-semibold text-brass' : 'block text-ink-soft'}>
        {marked.differenceMm2 === '0'
          ? 'as marked'
          : `${sign}${percentText(marked.differencePercent)}${marked.short ? `, short${claimed}` : ''}`}
      </span>
    </>
  );
}

const usesOf = ({ lines }: Receipt) => ({
  marked: lines.some((line) => line.marked !== null),
  batch: lines.some((line) => line.batch !== ''),
  material: lines.some(({ material = '0.00' }) => material !== '0.00'),
  costs: lines.some((line) => line.goods !== undefined),
});

function columnsFor(workshop: Workshop, receipt: Receipt): Column<ReceiptLine>[] {
  const { currency } = workshop;
  const uses = usesOf(receipt);
  const marked: Column<ReceiptLine> = {
    id: 'marked',
    header: 'Marked',
    value: (row) => row.marked?.differencePercent,
    cell: (row) => <MarkedOf line={row} workshop={workshop} />,
    align: 'right',
  };
  const batch: Column<ReceiptLine> = {
    id: 'batch',
    header: 'Batch',
    value: (row) => row.batch,
    cell: (row) => row.batch || '–',
  };
  const amount = (id: 'goods' | 'carriage' | 'material', header: string): Column<ReceiptLine> => ({
    id,
    header: `${header}, ${currency}`,
    value: (row) => row[id],
    cell: (row) => moneyText(row[id] ?? '0'),
    align: 'right',
    total: (rows) => sumMoney(rows.map((row) => row[id] ?? '0')),
  });
  return [
    {
      id: 'name',
      header: 'What',
      value: (row) => row.lotTag ?? row.name,
      cell: (row) => <NameOf line={row} />,
      onPhone: 'title',
    },
    {
      id: 'came',
      header: 'Came',
      value: (row) => row.areaMm2 ?? row.quantity,
      cell: (row) => goodsText(row, workshop),
      align: 'right',
    },
    ...(uses.marked ? [marked] : []),
    ...(uses.batch ? [batch] : []),
    ...(uses.material ? [amount('material', 'Leather before')] : []),
    ...(uses.costs
      ? [
          amount('goods', uses.material ? 'Goods and work' : 'Goods'),
          amount('carriage', 'Freight and duty'),
        ]
      : []),
  ];
}

export function ReceiptLinesTable({ receipt, label }: { receipt: Receipt; label: string }) {
  const workshop = useWorkshop();
  const columns = useMemo(() => columnsFor(workshop, receipt), [workshop, receipt]);
  return (
    <DataTable
      label={label}
      rows={receipt.lines}
      rowId={(row) => row.id}
      columns={columns}
      empty={null}
    />
  );
}

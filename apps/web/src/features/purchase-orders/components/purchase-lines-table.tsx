import type { PurchaseLine, PurchaseOrder } from '@hidewright/contract';
import { wholes } from '@hidewright/domain';
import { useMemo, useState } from 'react';
import type { Column } from '../../../components/column.ts';
import { DataTable } from '../../../components/data-table.tsx';
import { EmptyState } from '../../../components/empty-state.tsx';
import { TextLink } from '../../../components/text-link.tsx';
import { areaPriceText, countText, moneyText, unitPriceText } from '../../../lib/formatting.ts';
import { sumMoney } from '../../../lib/sum-money.ts';
import { areaUnits } from '../../../lib/units.ts';
import { useWorkshop, type Workshop } from '../../../lib/workshop.tsx';
import { goodsText } from '../goods-text.ts';
import { AwaitedDayDialog } from './awaited-day-dialog.tsx';
import { CloseLineDialog } from './close-line-dialog.tsx';
import { LineProgress } from './line-progress.tsx';
import { ReceivedOf } from './received-of.tsx';
import { ReopenDialog } from './reopen-dialog.tsx';

const placeOf = ({ service, leatherId, hardwareId }: PurchaseLine) => {
  if (service !== null) return `/stockroom/lots/${service.lotId}`;
  return leatherId === null
    ? `/stockroom/hardware/${hardwareId}`
    : `/stockroom/leather/${leatherId}`;
};

/** What is ordered, with its supplier's own number for it; of work on a lot, also what it becomes. */
function NameOf({ line }: { line: PurchaseLine }) {
  const { service, articleNumber } = line;
  return (
    <span className="block text-left">
      <TextLink to={placeOf(line)}>{line.name}</TextLink>
      {articleNumber !== '' && (
        <span className="block text-sm font-normal text-ink-soft">article {articleNumber}</span>
      )}
      {service?.changes && (
        <span className="block text-sm font-normal text-ink-soft">
          becomes {service.becomesName}
        </span>
      )}
    </span>
  );
}

/** An area with the sides that it is, where they come out even. */
function OrderedOf({ line }: { line: PurchaseLine }) {
  const { whole, unit } = line;
  return (
    <>
      {goodsText(line, useWorkshop(), unit)}
      {whole !== null && (
        <span className="block text-sm text-ink-soft">
          {countText(whole.count)} {wholes(whole)}
        </span>
      )}
    </>
  );
}

function PriceOf({ line: { of, unitPrice, fixedPrice = null } }: { line: PurchaseLine }) {
  const { areaUnit } = useWorkshop();
  if (fixedPrice !== null) return `${moneyText(fixedPrice)} for the lot`;
  if (unitPrice === undefined) return null;
  return of === 'hardware'
    ? `${unitPriceText(unitPrice)} each`
    : `${areaPriceText(unitPrice, areaUnit)} per ${areaUnits[areaUnit].sign}`;
}

function priceColumns(currency: string, order: PurchaseOrder): Column<PurchaseLine>[] {
  const ordered: Column<PurchaseLine>[] = [
    {
      id: 'price',
      header: `Price, ${currency}`,
      value: (row) => row.unitPrice,
      cell: (row) => <PriceOf line={row} />,
      align: 'right',
    },
    {
      id: 'amount',
      header: `Amount, ${currency}`,
      value: (row) => row.amount,
      cell: (row) => row.amount !== undefined && moneyText(row.amount),
      align: 'right',
      total: () => moneyText(order.total ?? '0'),
    },
  ];
  return order.receipts === 0 ? ordered : [...ordered, ...paidColumns(currency)];
}

function paidColumns(currency: string): Column<PurchaseLine>[] {
  return [
    {
      id: 'paid',
      header: `Paid, ${currency}`,
      value: (row) => row.paid,
      cell: (row) => row.paid !== undefined && moneyText(row.paid),
      align: 'right',
      total: (rows) => sumMoney(rows.map((row) => row.paid ?? '0')),
    },
    {
      id: 'difference',
      header: `Price difference, ${currency}`,
      value: (row) => row.priceDifference,
      cell: (row) => <PriceDifference amount={row.priceDifference ?? '0'} />,
      align: 'right',
      total: (rows) => sumMoney(rows.map((row) => row.priceDifference ?? '0')),
    },
  ];
}

function PriceDifference({ amount }: { amount: string }) {
  if (Number(amount) === 0) return '–';
  const dearer = Number(amount) > 0;
  return (
    <span className={dearer ? 'font-semibold text-oxblood' : undefined}>
      {`${dearer ? '+' : ''}${moneyText(amount)}`}
    </span>
  );
}

interface LineActs {
  move: (line: PurchaseLine) => void;
  close: (line: PurchaseLine) => void;
  reopen: (line: PurchaseLine) => void;
}

/** Of an order that was sent: what came of it, and what is still to come. */
function arrivalColumns(
  workshop: Workshop,
  order: PurchaseOrder,
  acts: LineActs | undefined,
): Column<PurchaseLine>[] {
  return [
    {
      id: 'received',
      header: 'Received',
      value: (row) => row.receivedAreaMm2 ?? row.received,
      cell: (row) => <ReceivedOf line={row} />,
      align: 'right',
    },
    {
      id: 'rest',
      header: 'Still to come',
      value: (row) => row.toCome.areaMm2 ?? row.toCome.quantity,
      cell: (row) => (
        <LineProgress
          line={row}
          order={order}
          today={workshop.today}
          onChangeDay={acts && (() => acts.move(row))}
          onCloseLine={acts && (() => acts.close(row))}
          onReopen={acts && (() => acts.reopen(row))}
        />
      ),
    },
  ];
}

function columnsFor(
  workshop: Workshop,
  order: PurchaseOrder,
  acts: LineActs | undefined,
): Column<PurchaseLine>[] {
  const { currency } = workshop;
  return [
    {
      id: 'name',
      header: 'What',
      value: (row) => row.name,
      cell: (row) => <NameOf line={row} />,
      onPhone: 'title',
    },
    {
      id: 'ordered',
      header: 'Ordered',
      value: (row) => row.areaMm2 ?? row.quantity,
      cell: (row) => <OrderedOf line={row} />,
      align: 'right',
    },
    ...(order.state === 'draft' ? [] : arrivalColumns(workshop, order, acts)),
    ...(order.total === undefined ? [] : priceColumns(currency, order)),
  ];
}

interface PurchaseLinesTableProps {
  order: PurchaseOrder;
  isOwner: boolean;
}

/** What is ordered, what of it came, and what it cost against its price. */
export function PurchaseLinesTable({ order, isOwner }: PurchaseLinesTableProps) {
  const workshop = useWorkshop();
  const [moving, setMoving] = useState<PurchaseLine>();
  const [closing, setClosing] = useState<PurchaseLine>();
  const [reopening, setReopening] = useState<PurchaseLine>();
  const columns = useMemo(
    () =>
      columnsFor(
        workshop,
        order,
        isOwner ? { move: setMoving, close: setClosing, reopen: setReopening } : undefined,
      ),
    [workshop, order, isOwner],
  );
  return (
    <>
      <DataTable
        label={`Lines of ${order.number}`}
        rows={order.lines}
        rowId={(row) => row.id}
        columns={columns}
        empty={<EmptyState title="Nothing is ordered yet." />}
      />
      {moving && (
        <AwaitedDayDialog order={order} line={moving} onClose={() => setMoving(undefined)} />
      )}
      {closing && (
        <CloseLineDialog order={order} line={closing} onClose={() => setClosing(undefined)} />
      )}
      {reopening && (
        <ReopenDialog order={order} line={reopening} onClose={() => setReopening(undefined)} />
      )}
    </>
  );
}

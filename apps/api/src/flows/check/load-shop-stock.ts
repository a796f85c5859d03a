import { usableOf, type ItemStock, type LeatherStock, type ShopStock } from '@hidewright/domain';
import { unscaled, unscaledText } from '../../db/columns/scaled-decimal.ts';
import type { Work } from '../../work.ts';
import { readItemSources, type ItemSource } from '../order-suggestions/item-sources.ts';
import { boughtKinds, boughtLeathers, type BoughtLeather } from './bought-rows.ts';
import { toRackLot, type LotRow } from './leather-for-check.ts';
import { buyingFrom, readOnOrder, type OnOrder, type Wanted } from './on-order.ts';
import { readOwedByStart } from './owed-by-start.ts';
import type { OwedToJobs } from './owed-to-jobs.ts';
import { readStandIns } from './stand-ins-for-check.ts';

/** All that runs may be given, in as many questions to the database whatever lies on the rack; tools aside. */
export async function loadShopStock(
  work: Work,
  wanted: Wanted,
  lots: readonly LotRow[],
): Promise<{ stock: Omit<ShopStock, 'tools'>; owed: OwedToJobs }> {
  const { em, today } = work;
  const leathers = await boughtLeathers(em, wanted.leatherIds);
  const standIns = await readStandIns(em, wanted.hardwareIds);
  const hardwareIds = [...new Set([...wanted.hardwareIds, ...standIns.partIds])];
  const kinds = await boughtKinds(em, hardwareIds);
  const sourceOf = await readItemSources(em, today, { ...wanted, hardwareIds });
  const onOrder = await readOnOrder(em, today, { ...wanted, hardwareIds });
  const { bench, held, owed } = await readOwedByStart(work);
  const free = await freeHardware(work, hardwareIds);
  const stock = {
    today,
    bench,
    held,
    leathers: leathers.map((leather) =>
      toLeatherStock(leather, {
        lots: lots.filter((row) => row.leather_id === leather.id).map(toRackLot),
        owed: owed.leather(leather.id),
        onOrder: onOrder({ leatherId: leather.id }),
        source: sourceOf(leather),
      }),
    ),
    items: kinds.map((kind) => ({
      hardwareId: kind.id,
      name: kind.name,
      kind: kind.kind,
      unit: kind.unit,
      fromCustomer: kind.from_customer === 1,
      standIns: standIns.of(kind.id),
      ...poolOf(kind.id, free, owed, onOrder({ hardwareId: kind.id })),
      buying: buyingFrom(sourceOf(kind), onOrder({ hardwareId: kind.id }), {
        fromCustomer: kind.from_customer === 1,
      }),
    })),
  };
  return { stock, owed };
}

function poolOf(
  id: number,
  free: ReadonlyMap<number, number>,
  owed: OwedToJobs,
  { receipts }: OnOrder,
): Pick<ItemStock, 'pool'> {
  return { pool: { free: free.get(id) ?? 0, receipts, promised: owed.hardware(id) } };
}

async function freeHardware({ em }: Work, ids: readonly number[]): Promise<Map<number, number>> {
  const rows = await em.execute<{ id: number; free: number }[]>(
    `SELECT hardware_id AS id, MAX(0, on_hand - reserved) AS free FROM stock_balance
    WHERE hardware_id IN (SELECT value FROM json_each(?))`,
    [JSON.stringify(ids)],
  );
  return new Map(rows.map(({ id, free }) => [id, free]));
}

interface OfLeather {
  lots: LeatherStock['lots'];
  owed: { day: string; quantity: number }[];
  onOrder: OnOrder;
  source: ItemSource;
}

/** What other jobs still need comes from the rack first, and beyond that from what is on order. */
function toLeatherStock(
  leather: BoughtLeather,
  { lots, owed, onOrder, source }: OfLeather,
): LeatherStock {
  const usable = usableOf(lots);
  const usablePercent = unscaled(leather.usable_percent, 4);
  const usableShare = usablePercent.dividedBy(100);
  const cuttable = (thousandths: number) => usableShare.times(thousandths).floor().toNumber();
  let onRack = usable;
  const promised = owed.map((each) => {
    const fromRack = Math.min(onRack, each.quantity);
    onRack -= fromRack;
    return { ...each, quantity: each.quantity - fromRack };
  });
  return {
    leatherId: leather.id,
    name: leather.name,
    weight: {
      weightLowOz: unscaledText(leather.weight_low_oz, 3),
      weightHighOz: unscaledText(leather.weight_high_oz, 3),
    },
    lots,
    owed: usable - onRack,
    pool: {
      free: 0,
      receipts: onOrder.receipts.map((each) => ({ ...each, quantity: cuttable(each.quantity) })),
      promised: promised.filter(({ quantity }) => quantity > 0),
    },
    whole:
      leather.whole_form === null || leather.whole_area === null
        ? null
        : { form: leather.whole_form, areaMm2: unscaled(leather.whole_area, 3).toString() },
    usablePercent: usablePercent.toString(),
    buying: buyingFrom(source, { ...onOrder, drafted: cuttable(onOrder.drafted) }),
  };
}

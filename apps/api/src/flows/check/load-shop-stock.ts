import { usableOf, type ItemStock, type LeatherStock, type ShopStock } from '@hidewright/domain';
import { Hardware } from '../../modules/hardware/hardware.entity.ts';
import { Leather } from '../../modules/leathers/leather.entity.ts';
import type { Work } from '../../work.ts';
import { benchToday, openJobs } from '../bench-load.ts';
import { readItemSources, type ItemSource } from '../order-suggestions/item-sources.ts';
import { boughtHardware, boughtLeather } from './bought-rows.ts';
import { toRackLot, type LotRow } from './leather-for-check.ts';
import { buyingFrom, readOnOrder, type OnOrder, type Wanted } from './on-order.ts';
import { readOwedToJobs, type OwedToJobs } from './owed-to-jobs.ts';
import { readStandIns } from './stand-ins-for-check.ts';

/** All that runs may be given, in as many questions to the database whatever lies on the rack; tools aside. */
export async function loadShopStock(
  work: Work,
  wanted: Wanted,
  lots: readonly LotRow[],
): Promise<Omit<ShopStock, 'tools'>> {
  const { em, today } = work;
  const leathers = await em.find(Leather, { id: { $in: [...wanted.leatherIds] } });
  const standIns = await readStandIns(em, wanted.hardwareIds);
  const hardwareIds = [...new Set([...wanted.hardwareIds, ...standIns.partIds])];
  const kinds = await em.find(Hardware, { id: { $in: hardwareIds } });
  const sourceOf = await readItemSources(em, today, { ...wanted, hardwareIds });
  const onOrder = await readOnOrder(em, today, { ...wanted, hardwareIds });
  const owed = await readOwedToJobs(em);
  const free = await freeHardware(work, hardwareIds);
  return {
    today,
    bench: await benchToday(work),
    held: await openJobs(em),
    leathers: leathers.map((leather) =>
      toLeatherStock(leather, {
        lots: lots.filter((row) => row.leather_id === leather.id).map(toRackLot),
        owed: owed.leather(leather.id),
        onOrder: onOrder({ leatherId: leather.id }),
        source: sourceOf(boughtLeather(leather)),
      }),
    ),
    items: kinds.map((kind) => ({
      hardwareId: kind.id,
      name: kind.name,
      kind: kind.kind,
      fromCustomer: kind.fromCustomer,
      standIns: standIns.of(kind.id),
      ...poolOf(kind.id, free, owed, onOrder({ hardwareId: kind.id })),
      buying: buyingFrom(sourceOf(boughtHardware(kind)), onOrder({ hardwareId: kind.id }), kind),
    })),
  };
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
  leather: Leather,
  { lots, owed, onOrder, source }: OfLeather,
): LeatherStock {
  const usable = usableOf(lots);
  const usableShare = leather.wholeUsablePercent.dividedBy(100);
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
    lots,
    owed: usable - onRack,
    pool: {
      free: 0,
      receipts: onOrder.receipts.map((each) => ({ ...each, quantity: cuttable(each.quantity) })),
      promised: promised.filter(({ quantity }) => quantity > 0),
    },
    whole:
      leather.wholeForm === null || leather.wholeAreaMm2 === null
        ? null
        : { form: leather.wholeForm, areaMm2: leather.wholeAreaMm2.toString() },
    usablePercent: leather.wholeUsablePercent.toString(),
    buying: buyingFrom(source, { ...onOrder, drafted: cuttable(onOrder.drafted) }),
  };
}

import { Decimal } from 'decimal.js';
import type { ReceivedHardware, ReceivedLot } from '@hidewright/contract';
import { shareCarriage, type CarriageBasis, type CarriedLine } from '@hidewright/domain';
import { scaled } from '../../db/columns/scaled-decimal.ts';
import { moneyText } from '../../http/decimal-text.ts';
import { invalid } from '../../http/problem.ts';
import { Hardware } from '../../modules/hardware/hardware.entity.ts';
import { Leather } from '../../modules/leathers/leather.entity.ts';
import { hardwareCost, leatherCost } from '../../modules/purchase-orders/line-amount.ts';
import type { PurchaseLine } from '../../modules/purchase-orders/purchase-line.entity.ts';
import type { OpenDelivery } from '../../modules/purchase-orders/open-delivery.ts';
import type { Work } from '../../work.ts';

/** Nothing, but of what was out for a service. */
const material = new Decimal(0);

interface Priced {
  field: string;
  purchaseLineId: number | null;
  /** Thousandths of mm² as measured, or pieces. */
  quantity: number;
  markedAreaMm2: Decimal | null;
  batch: string;
  /** What the goods cost. */
  goods: Decimal;
  /** Of leather that was out for a service: what it had cost before. */
  material: Decimal;
}

export type LotLine = Priced & {
  of: 'lot';
  typed: ReceivedLot;
  leather: Leather;
  /** The line that it was out on. */
  service: PurchaseLine | null;
};
/** A line of a delivery: what came, at what it costs. */
export type PricedLine = LotLine | (Priced & { of: 'hardware'; hardware: Hardware });
/** With its share of freight and duty. */
export type LandedLine = PricedLine & { carriage: Decimal };

/** A lot as it came: what is marked on it is paid for, and what is measured goes on the rack. */
export async function priceLot(
  work: Work,
  delivery: OpenDelivery,
  typed: ReceivedLot,
  field: string,
): Promise<PricedLine> {
  const leather = await work.em.findOne(Leather, typed.leatherId);
  if (leather === null)
    throw invalid([{ field: `${field}.leatherId`, message: 'Choose a leather from the list.' }]);
  const quantity = scaled(new Decimal(typed.measuredAreaMm2), 3);
  const paidFor = new Decimal(typed.markedAreaMm2 ?? typed.measuredAreaMm2);
  const line = delivery.fill(typed, scaled(paidFor, 3), field);
  const goods =
    typed.cost === null
      ? leatherCost(paidFor, line?.unitPrice ?? leather.pricePerFt2, `${field}.cost`)
      : new Decimal(typed.cost);
  const markedAreaMm2 = typed.markedAreaMm2 === null ? null : new Decimal(typed.markedAreaMm2);
  const purchaseLineId = line?.id ?? null;
  const service = line?.service ? line : null;
  const priced = { field, purchaseLineId, quantity, markedAreaMm2, batch: '', goods, material };
  return { of: 'lot', typed, leather, service, ...priced };
}

export async function priceHardware(
  work: Work,
  delivery: OpenDelivery,
  typed: ReceivedHardware,
  field: string,
): Promise<PricedLine> {
  const hardware = await work.em.findOne(Hardware, typed.hardwareId);
  if (hardware === null) {
    throw invalid([
      { field: `${field}.hardwareId`, message: 'Choose hardware or supplies from the list.' },
    ]);
  }
  const { quantity, batch } = typed;
  const line = delivery.fill(typed, quantity, field);
  const goods = goodsOf(hardware, typed, { field: `${field}.cost`, ordered: line?.unitPrice });
  const purchaseLineId = line?.id ?? null;
  const priced = { field, purchaseLineId, quantity, markedAreaMm2: null, batch, goods, material };
  return { of: 'hardware', hardware, ...priced };
}

function goodsOf(
  hardware: Hardware,
  { quantity, cost }: ReceivedHardware,
  { field, ordered }: { field: string; ordered: Decimal | undefined },
): Decimal {
  if (hardware.fromCustomer) {
    requireNoCost(hardware, cost, field);
    return new Decimal(0);
  }
  if (cost !== null) return new Decimal(cost);
  return hardwareCost(quantity, ordered ?? hardware.unitPrice, field);
}

/**
 * What the customer brings has no value in stock.
 * @throws {Problem} 422 where it is said to have cost something
 */
export function requireNoCost({ name }: Hardware, cost: string | null, field: string): void {
  if (cost === null || new Decimal(cost).isZero()) return;
  throw invalid([{ field, message: `The customer brings ${name}: leave its cost empty.` }]);
}

interface Carriage {
  freight: string;
  duty: string;
  sharedBy: CarriageBasis;
}

/**
 * What each line bears of freight and duty: both are shared out by themselves, so that either sums to what was typed.
 * @throws {InvalidInput} where nothing that came can bear them
 */
export function carriageOf(
  lines: readonly CarriedLine[],
  { freight, duty, sharedBy }: Carriage,
): Decimal[] {
  const shares = [freight, duty].map((amount) => shareCarriage(amount, lines, sharedBy));
  return lines.map((_, at) =>
    shares.reduce((sum, parts) => sum.plus(parts[at] ?? 0), new Decimal(0)),
  );
}

/** The lines with what each bears of freight and duty. */
export function withCarriage(lines: PricedLine[], carriage: Carriage): LandedLine[] {
  const carried = lines.map((line) => ({
    goods: moneyText(line.goods),
    areaMm2: line.of === 'lot' ? line.typed.measuredAreaMm2 : null,
    quantity: line.of === 'lot' || line.hardware.fromCustomer ? null : line.quantity,
  }));
  const shares = carriageOf(carried, carriage);
  return lines.map((line, at) => ({ ...line, carriage: shares[at] ?? new Decimal(0) }));
}

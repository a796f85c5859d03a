import { Decimal } from 'decimal.js';
import { round } from '@hidewright/domain';
import { scaled } from '../db/columns/scaled-decimal.ts';
import type { ReceiptLine } from '../modules/receipts/receipt-line.entity.ts';
import type { StockMovement } from '../modules/stock/stock-movement.entity.ts';
import { ClaimedLot } from '../modules/supplier-claims/claimed-lot.entity.ts';
import { SupplierClaim } from '../modules/supplier-claims/supplier-claim.entity.ts';
import type { Work } from '../work.ts';

/**
 * What went back to its supplier is owed for until it is credited; nothing is where nothing was paid.
 * @param came the lines of the order's deliveries on which it came
 */
export async function claimWhatWentBack(
  work: Work,
  purchaseOrderId: number,
  movement: StockMovement,
  came: ReceiptLine[],
): Promise<void> {
  const worth = await paidFor(work, -movement.quantity, came);
  if (worth.isZero()) return;
  work.em.create(SupplierClaim, {
    purchaseOrderId,
    movementId: movement.id,
    state: 'open',
    worth,
    text: '',
    sentBy: 'hand',
    openedAt: work.now.toISOString(),
  });
  await work.em.flush();
}

/** Its share of what the goods cost; freight and duty are not the supplier's to give back. */
async function paidFor(work: Work, quantity: number, came: ReceiptLine[]): Promise<Decimal> {
  let paidQuantity = 0;
  for (const line of came) paidQuantity += await paidAs(work, line);
  const goods = Decimal.sum(0, ...came.map((line) => line.goods));
  return round(goods.times(quantity).dividedBy(paidQuantity), 2);
}

/** A lot whose missing area was claimed is owed for by its mark, so that no area is claimed twice. */
async function paidAs({ em }: Work, line: ReceiptLine): Promise<number> {
  if (line.markedAreaMm2 === null) return line.quantity;
  const claimed = await em.findOne(ClaimedLot, { receiptLineId: line.id });
  if (claimed === null) return line.quantity;
  const { state } = await em.findOneOrFail(SupplierClaim, claimed.supplierClaimId);
  return state === 'given up' ? line.quantity : scaled(line.markedAreaMm2, 3);
}

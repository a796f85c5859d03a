import { Decimal } from 'decimal.js';
import type { draftClaim as endpoint, Receipt, ReceiptLine, ReplyOf } from '@hidewright/contract';
import { moneyText } from '../http/decimal-text.ts';
import { wrongState } from '../http/problem.ts';
import { Leather } from '../modules/leathers/leather.entity.ts';
import { findLot } from '../modules/lots/find-lot.ts';
import { findPurchaseOrder } from '../modules/purchase-orders/draft-purchase-order.ts';
import { leatherCost } from '../modules/purchase-orders/line-amount.ts';
import { PurchaseLine } from '../modules/purchase-orders/purchase-line.entity.ts';
import type { PurchaseOrder } from '../modules/purchase-orders/purchase-order.entity.ts';
import { readOneReceipt } from '../modules/receipts/read-receipts.ts';
import { claimLetter } from '../modules/supplier-claims/claim-letter.ts';
import { Supplier } from '../modules/suppliers/supplier.entity.ts';
import { Workshop } from '../modules/workshop/workshop.entity.ts';
import type { Work } from '../work.ts';

interface ClaimDraft extends ReplyOf<typeof endpoint> {
  order: PurchaseOrder;
  lines: ReceiptLine[];
}

/**
 * What can be claimed of a delivery: every lot that is short of its mark beyond the tolerance and not claimed yet, the
 * area that is missing and what it was paid for, and a letter to start from.
 * @throws {Problem} 409 when there is nothing to claim, or nobody to claim it from
 */
export async function draftClaim(work: Work, receiptId: number): Promise<ClaimDraft> {
  const receipt = await readOneReceipt(work.em, receiptId);
  if (receipt.purchaseOrderId === null)
    throw wrongState('This came without an order, so there is no supplier to claim it from.');
  const lines = receipt.lines.filter((line) => line.marked?.short && line.claimId === null);
  if (lines.length === 0) throw nothingToClaim(receipt);
  const order = await findPurchaseOrder(work, receipt.purchaseOrderId);
  const supplier = await work.em.findOneOrFail(Supplier, order.supplierId);
  const workshop = await work.em.findOneOrFail(Workshop, 1);
  const claimed = {
    supplierName: supplier.name,
    lots: lines.map(lotOf),
    missingAreaMm2: Decimal.sum(0, ...lines.map(missingOf)).toFixed(),
    worth: moneyText(await worthOf(work, lines)),
  };
  const { receivedOn } = receipt;
  const text = claimLetter({ ...claimed, orderNumber: order.number, receivedOn }, workshop);
  return { ...claimed, supplierEmail: supplier.email, text, order, lines };
}

function nothingToClaim({ lines, tolerancePercent }: Receipt) {
  const claimed = lines.some((line) => line.claimId !== null);
  return wrongState(
    claimed
      ? 'Everything that was short in this delivery is claimed already.'
      : `No lot of this delivery misses its marked area by more than ${tolerancePercent} %.`,
  );
}

const missingOf = ({ marked }: ReceiptLine) => new Decimal(marked?.differenceMm2 ?? 0).negated();

const lotOf = (line: ReceiptLine) => ({
  receiptLineId: line.id,
  lotId: line.lotId ?? 0,
  lotTag: line.lotTag ?? '',
  leatherName: line.name,
  markedAreaMm2: line.marked?.areaMm2 ?? '0',
  measuredAreaMm2: line.areaMm2 ?? '0',
});

/** At the price of the order's line, lot by lot, each to the cent. */
async function worthOf(work: Work, lines: ReceiptLine[]): Promise<Decimal> {
  let worth = new Decimal(0);
  for (const line of lines)
    worth = worth.plus(leatherCost(missingOf(line), await priceOf(work, line), 'text'));
  return worth;
}

async function priceOf(work: Work, line: ReceiptLine): Promise<Decimal> {
  const ordered =
    line.purchaseLineId === null ? null : await work.em.findOne(PurchaseLine, line.purchaseLineId);
  if (ordered !== null) return ordered.unitPrice;
  const { leatherId } = await findLot(work.em, line.lotId ?? 0);
  return (await work.em.findOneOrFail(Leather, leatherId)).pricePerFt2;
}

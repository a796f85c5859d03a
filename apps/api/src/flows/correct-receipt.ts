import { Decimal } from 'decimal.js';
import type { BodyOf, changeReceipt } from '@hidewright/contract';
import { unscaled } from '../db/columns/scaled-decimal.ts';
import { moneyText } from '../http/decimal-text.ts';
import { invalid, wrongState } from '../http/problem.ts';
import { logDeed } from '../modules/activity/activity-log.ts';
import { Hardware } from '../modules/hardware/hardware.entity.ts';
import { findLot } from '../modules/lots/find-lot.ts';
import { priceDifferenceOf } from '../modules/purchase-orders/paid-for-lines.ts';
import { raiseVersion } from '../modules/receipts/raise-version.ts';
import { readOneReceipt } from '../modules/receipts/read-receipts.ts';
import { ReceiptLine } from '../modules/receipts/receipt-line.entity.ts';
import type { Receipt } from '../modules/receipts/receipt.entity.ts';
import { receiveStock, undoReceipt } from '../modules/stock/stock-ledger.ts';
import { sayDay } from '../say-day.ts';
import type { Work } from '../work.ts';
import { carriageOf, requireNoCost } from './receive/price-delivery.ts';
import { cameWith } from './receive/put-on-rack.ts';

type Correction = BodyOf<typeof changeReceipt>;

/**
 * Puts right what a delivery cost, once its papers are there: freight, duty, and what was paid for the goods. What it
 * put into the ledger is taken out and written again, so that both can be read there; what was used since keeps its
 * cost, and so a delivery of which something was used stays as it is.
 * @throws {Problem} 409 when something of it was used
 */
export async function correctReceipt(
  work: Work,
  receipt: Receipt,
  typed: Correction,
): Promise<void> {
  await requireUnused(work, receipt);
  const readVersion = receipt.version;
  const lines = await work.em.find(
    ReceiptLine,
    { receiptId: receipt.id },
    { orderBy: { position: 'asc' } },
  );
  for (const line of [...lines].reverse()) await takeOut(work, receipt, line);
  const theirs = await readTheirs(work, lines);
  for (const [at, { receiptLineId, goods }] of (typed.goods ?? []).entries()) {
    const line = lineOf(lines, receiptLineId);
    const brought = theirs.get(line.hardwareId);
    const same = line.goods.equals(goods);
    if (brought && !same) requireNoCost(brought, goods, `goods.${at}.goods`);
    line.goods = new Decimal(goods);
  }
  if (typed.freight !== undefined) receipt.freight = new Decimal(typed.freight);
  if (typed.duty !== undefined) receipt.duty = new Decimal(typed.duty);
  if (typed.sharedBy !== undefined) receipt.sharedBy = typed.sharedBy;
  shareOut(receipt, lines, theirs);
  for (const line of lines) await putBack(work, receipt, line);
  receipt.priceDifference = await priceDifferenceOf(work.em, lines);
  await raiseVersion(work, receipt, readVersion);
  await logDeed(work, {
    action: `put right what the delivery of ${sayDay(receipt.receivedOn)} cost`,
    subjectKind: 'delivery',
    subjectId: receipt.id,
    detail: { changed: Object.keys(typed) },
  });
}

async function requireUnused(work: Work, receipt: Receipt): Promise<void> {
  const { staysBecause } = await readOneReceipt(work.em, receipt.id);
  if (staysBecause !== null) throw wrongState(staysBecause);
}

function lineOf(lines: ReceiptLine[], id: number): ReceiptLine {
  const line = lines.find((each) => each.id === id);
  if (line !== undefined) return line;
  throw invalid([{ field: 'goods', message: 'Choose lines of this delivery.' }]);
}

const itemOf = ({ lotId, hardwareId }: ReceiptLine) =>
  lotId === null ? { hardwareId: hardwareId ?? 0 } : { lotId };

async function takeOut(work: Work, { purchaseOrderId }: Receipt, line: ReceiptLine) {
  const value = line.goods.plus(line.carriage).plus(line.material);
  const reason = 'to be written again at another cost';
  const { quantity } = line;
  await undoReceipt(work, { ...itemOf(line), quantity, value, purchaseOrderId, reason });
}

type Theirs = ReadonlyMap<number | null, Hardware>;

/** The hardware among the lines that the customer brings. */
async function readTheirs({ em }: Work, lines: ReceiptLine[]): Promise<Theirs> {
  const ids = lines.flatMap(({ hardwareId }) => hardwareId ?? []);
  const brought = await em.find(Hardware, { id: { $in: ids }, fromCustomer: true });
  return new Map(brought.map((hardware) => [hardware.id, hardware]));
}

function shareOut(receipt: Receipt, lines: ReceiptLine[], theirs: Theirs): void {
  const carried = lines.map(({ goods, lotId, hardwareId, quantity }) => ({
    goods: theirs.has(hardwareId) ? '0' : moneyText(goods),
    areaMm2: lotId === null ? null : unscaled(quantity, 3).toFixed(),
    quantity: lotId === null && !theirs.has(hardwareId) ? quantity : null,
  }));
  const shares = carriageOf(carried, {
    freight: moneyText(receipt.freight),
    duty: moneyText(receipt.duty),
    sharedBy: receipt.sharedBy,
  });
  lines.forEach((line, at) => {
    line.carriage = shares[at] ?? new Decimal(0);
  });
}

async function putBack(work: Work, receipt: Receipt, line: ReceiptLine) {
  const value = line.goods.plus(line.carriage).plus(line.material);
  const reason = [cameWith(receipt, line.batch), 'cost put right'].filter(Boolean).join(', ');
  const { quantity } = line;
  const { purchaseOrderId } = receipt;
  if (line.lotId !== null) (await findLot(work.em, line.lotId)).cost = value;
  const put = { ...itemOf(line), quantity, value, purchaseOrderId, reason };
  line.movementId = (await receiveStock(work, put)).id;
}

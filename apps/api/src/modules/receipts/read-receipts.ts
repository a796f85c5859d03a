import type { EntityManager } from '@mikro-orm/sqlite';
import { compareArea } from '@hidewright/domain';
import type { Receipt as ReceiptReply, ReceiptLine as LineReply } from '@hidewright/contract';
import { unscaled } from '../../db/columns/scaled-decimal.ts';
import { when, whereAll } from '../../db/sql-conditions.ts';
import { moneyText } from '../../http/decimal-text.ts';
import { notFound } from '../../http/problem.ts';
import { answerTo, readAnswers, type AnswerRow } from './read-answers.ts';
import { whyCostStays, type MovedSince } from './why-cost-stays.ts';

interface Asked {
  id?: number | undefined;
  below?: number | undefined;
  purchaseOrderId?: number | undefined;
  withoutOrder?: 'yes' | undefined;
  limit?: number;
}

interface Row {
  id: number;
  purchase_order_id: number | null;
  purchase_order_number: string | null;
  received_on: string;
  at: string;
  actor_name: string;
  tolerance_percent: number;
  freight: number;
  duty: number;
  shared_by: ReceiptReply['sharedBy'];
  price_difference: number;
  version: number;
}

interface LineRow {
  id: number;
  receipt_id: number;
  purchase_line_id: number | null;
  lot_id: number | null;
  lot_tag: string | null;
  hardware_id: number | null;
  name: string;
  quantity: number;
  marked_area_mm2: number | null;
  batch: string;
  goods: number;
  carriage: number;
  material: number;
  claim_id: number | null;
  moved_since: MovedSince | null;
}

/** Deliveries with everything that came, newest first. */
export async function readReceiptList(em: EntityManager, asked: Asked): Promise<ReceiptReply[]> {
  const { where, values } = whereAll([
    ...when(asked.id, 'r.id = ?'),
    ...when(asked.below, 'r.id < ?'),
    ...when(asked.purchaseOrderId, 'r.purchase_order_id = ?'),
    ...when(asked.withoutOrder, 'r.purchase_order_id IS NULL', () => []),
  ]);
  const rows = await em.execute<Row[]>(
    `SELECT r.*, p.number AS purchase_order_number
     FROM receipt r LEFT JOIN purchase_order p ON p.id = r.purchase_order_id
     ${where} ORDER BY r.id DESC LIMIT ?`,
    [...values, asked.limit ?? 1],
  );
  const ids = rows.map((row) => row.id);
  const lines = await readLines(em, ids);
  const answers = await readAnswers(em, ids);
  return rows.map((row) =>
    toReply(
      row,
      lines.filter((line) => line.receipt_id === row.id),
      answers.filter((answer) => answer.receipt_id === row.id),
    ),
  );
}

/** @throws {Problem} 404 */
export async function readOneReceipt(em: EntityManager, id: number): Promise<ReceiptReply> {
  const [found] = await readReceiptList(em, { id });
  if (found === undefined) throw notFound('delivery');
  return found;
}

/**
 * What moved is anything in the ledger after the whole receipt. That more of the same came changes no average, since
 * that is the sum of what came; first in, first out it does, because what is written again would be the newest layer.
 */
const moved = (kinds: string) => `EXISTS (SELECT 1 FROM stock_movement m
  WHERE (m.lot_id = l.lot_id OR m.hardware_id = l.hardware_id) AND ${kinds}
    AND m.id > (SELECT MAX(o.movement_id) FROM receipt_line o WHERE o.receipt_id = l.receipt_id))`;
const movedSince = `CASE WHEN ${moved(`m.kind <> 'receive'`)} THEN 'used'
  WHEN (SELECT stock_value FROM workshop) = 'first in first out' AND ${moved(`m.kind = 'receive'`)}
  THEN 'more came' END`;

async function readLines(em: EntityManager, receiptIds: number[]): Promise<LineRow[]> {
  if (receiptIds.length === 0) return [];
  const places = receiptIds.map(() => '?').join(', ');
  return em.execute<LineRow[]>(
    `SELECT l.*, lot.tag AS lot_tag, COALESCE(h.name, leather.name) AS name,
       c.supplier_claim_id AS claim_id, ${movedSince} AS moved_since
     FROM receipt_line l
     LEFT JOIN lot ON lot.id = l.lot_id
     LEFT JOIN leather ON leather.id = lot.leather_id
     LEFT JOIN hardware h ON h.id = l.hardware_id
     LEFT JOIN claimed_lot c ON c.receipt_line_id = l.id
     WHERE l.receipt_id IN (${places}) ORDER BY l.receipt_id, l.position`,
    receiptIds,
  );
}

function toReply(row: Row, lines: LineRow[], answers: AnswerRow[]): ReceiptReply {
  const tolerancePercent = unscaled(row.tolerance_percent, 4).toString();
  return {
    id: row.id,
    purchaseOrderId: row.purchase_order_id,
    purchaseOrderNumber: row.purchase_order_number,
    receivedOn: row.received_on,
    at: row.at,
    byName: row.actor_name,
    tolerancePercent,
    freight: moneyText(unscaled(row.freight, 2)),
    duty: moneyText(unscaled(row.duty, 2)),
    sharedBy: row.shared_by,
    staysBecause: whyCostStays(lines),
    priceDifference: moneyText(unscaled(row.price_difference, 2)),
    letStand: answerTo('price', answers),
    notClaimed: answerTo('short', answers),
    lines: lines.map((line) => toLine(line, tolerancePercent)),
    version: row.version,
  };
}

function toLine(row: LineRow, tolerancePercent: string): LineReply {
  const ofLot = row.lot_id !== null;
  const areaMm2 = ofLot ? unscaled(row.quantity, 3).toFixed() : null;
  return {
    id: row.id,
    purchaseLineId: row.purchase_line_id,
    lotId: row.lot_id,
    lotTag: row.lot_tag,
    hardwareId: row.hardware_id,
    name: row.name,
    areaMm2,
    quantity: ofLot ? null : row.quantity,
    batch: row.batch,
    marked: markedOf(row.marked_area_mm2, areaMm2, tolerancePercent),
    claimId: row.claim_id,
    goods: moneyText(unscaled(row.goods, 2)),
    carriage: moneyText(unscaled(row.carriage, 2)),
    material: moneyText(unscaled(row.material, 2)),
  };
}

function markedOf(
  marked: number | null,
  measuredMm2: string | null,
  tolerancePercent: string,
): LineReply['marked'] {
  if (marked === null || measuredMm2 === null) return null;
  const areaMm2 = unscaled(marked, 3).toFixed();
  const { differenceMm2, percent, short } = compareArea(areaMm2, measuredMm2, tolerancePercent);
  return { areaMm2, differenceMm2, differencePercent: percent, short };
}

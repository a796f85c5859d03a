import type { EntityManager } from '@mikro-orm/sqlite';
import type { SupplierClaim as ClaimReply } from '@hidewright/contract';
import type { HardwareUnit } from '@hidewright/domain';
import { unscaled } from '../../db/columns/scaled-decimal.ts';
import { when, whereAll } from '../../db/sql-conditions.ts';
import { moneyText } from '../../http/decimal-text.ts';
import { notFound } from '../../http/problem.ts';

interface Row {
  id: number;
  purchase_order_id: number;
  purchase_order_number: string;
  supplier_name: string;
  receipt_id: number | null;
  missing_area_mm2: number | null;
  state: ClaimReply['state'];
  worth: number;
  text: string;
  sent_by: ClaimReply['sentBy'];
  credited: number | null;
  note: string;
  opened_at: string;
  closed_at: string | null;
  version: number;
}

interface ReturnRow {
  claim_id: number;
  day: string;
  lot_id: number | null;
  tag: string | null;
  hardware_id: number | null;
  name: string;
  unit: HardwareUnit | null;
  quantity: number;
  reason: string;
}

interface LotRow {
  claim_id: number;
  receipt_line_id: number;
  lot_id: number;
  tag: string;
  leather_name: string;
  marked_area_mm2: number;
  quantity: number;
}

interface CreditRow {
  claim_id: number;
  credited: number;
  reason: string;
  at: string;
  actor_name: string;
}

interface Asked {
  id?: number | undefined;
  purchaseOrderId?: number | undefined;
}

/** What was claimed of suppliers, newest first. */
export async function readClaimList(em: EntityManager, asked: Asked): Promise<ClaimReply[]> {
  const { where, values } = whereAll([
    ...when(asked.id, 'c.id = ?'),
    ...when(asked.purchaseOrderId, 'c.purchase_order_id = ?'),
  ]);
  const rows = await em.execute<Row[]>(
    `SELECT c.*, p.number AS purchase_order_number, s.name AS supplier_name FROM supplier_claim c
     JOIN purchase_order p ON p.id = c.purchase_order_id JOIN supplier s ON s.id = p.supplier_id
     ${where} ORDER BY c.id DESC`,
    values,
  );
  const lots = await em.execute<LotRow[]>(
    `SELECT c.id AS claim_id, l.id AS receipt_line_id, l.lot_id, lot.tag, leather.name AS leather_name,
       l.marked_area_mm2, l.quantity
     FROM supplier_claim c JOIN claimed_lot k ON k.supplier_claim_id = c.id
     JOIN receipt_line l ON l.id = k.receipt_line_id JOIN lot ON lot.id = l.lot_id
     JOIN leather ON leather.id = lot.leather_id ${where} ORDER BY l.position`,
    values,
  );
  const returns = await em.execute<ReturnRow[]>(
    `SELECT c.id AS claim_id, m.day, m.lot_id, lot.tag, m.hardware_id, COALESCE(h.name, leather.name) AS name, h.unit,
       -m.quantity AS quantity, m.reason
     FROM supplier_claim c JOIN stock_movement m ON m.id = c.movement_id
     LEFT JOIN hardware h ON h.id = m.hardware_id
     LEFT JOIN lot ON lot.id = m.lot_id LEFT JOIN leather ON leather.id = lot.leather_id ${where}`,
    values,
  );
  const credits = await em.execute<CreditRow[]>(
    `SELECT k.supplier_claim_id AS claim_id, k.* FROM claim_credit k
     JOIN supplier_claim c ON c.id = k.supplier_claim_id ${where} ORDER BY k.id`,
    values,
  );
  return rows.map((row) =>
    toReply(row, {
      lots: lots.filter((lot) => lot.claim_id === row.id),
      sentBack: returns.find((back) => back.claim_id === row.id),
      credits: credits.filter((credit) => credit.claim_id === row.id),
    }),
  );
}

/** @throws {Problem} 404 */
export async function readOneClaim(em: EntityManager, id: number): Promise<ClaimReply> {
  const [found] = await readClaimList(em, { id });
  if (found === undefined) throw notFound('claim');
  return found;
}

const areaText = (thousandths: number) => unscaled(thousandths, 3).toFixed();
const amountText = (hundredths: number) => moneyText(unscaled(hundredths, 2));

interface Parts {
  lots: LotRow[];
  sentBack: ReturnRow | undefined;
  credits: CreditRow[];
}

function toReply(row: Row, { lots, sentBack, credits }: Parts): ClaimReply {
  return {
    id: row.id,
    purchaseOrderId: row.purchase_order_id,
    purchaseOrderNumber: row.purchase_order_number,
    supplierName: row.supplier_name,
    state: row.state,
    short: shortOf(row, lots),
    sentBack: sentBack === undefined ? null : sentBackOf(sentBack),
    worth: amountText(row.worth),
    text: row.text,
    sentBy: row.sent_by,
    openedAt: row.opened_at,
    credited: row.credited === null ? null : amountText(row.credited),
    credits: credits.map(({ credited, reason, at, actor_name: by }) => ({
      credited: amountText(credited),
      reason,
      at,
      by,
    })),
    note: row.note,
    closedAt: row.closed_at,
    version: row.version,
  };
}

function shortOf({ receipt_id, missing_area_mm2 }: Row, lots: LotRow[]): ClaimReply['short'] {
  if (receipt_id === null || missing_area_mm2 === null) return null;
  return {
    receiptId: receipt_id,
    lots: lots.map((lot) => ({
      receiptLineId: lot.receipt_line_id,
      lotId: lot.lot_id,
      lotTag: lot.tag,
      leatherName: lot.leather_name,
      markedAreaMm2: areaText(lot.marked_area_mm2),
      measuredAreaMm2: areaText(lot.quantity),
    })),
    missingAreaMm2: areaText(missing_area_mm2),
  };
}

function sentBackOf(row: ReturnRow): ClaimReply['sentBack'] {
  const ofLot = row.lot_id !== null;
  return {
    on: row.day,
    lotId: row.lot_id,
    lotTag: row.tag,
    hardwareId: row.hardware_id,
    name: row.name,
    unit: row.unit,
    areaMm2: ofLot ? areaText(row.quantity) : null,
    quantity: ofLot ? null : row.quantity,
    reason: row.reason,
  };
}

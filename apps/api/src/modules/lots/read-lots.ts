import type { EntityManager } from '@mikro-orm/sqlite';
import type { Lot as LotReply } from '@hidewright/contract';
import { unscaled } from '../../db/columns/scaled-decimal.ts';
import { when, whereAll } from '../../db/sql-conditions.ts';
import { moneyText } from '../../http/decimal-text.ts';
import { notFound } from '../../http/problem.ts';
import { linesOut, readOut } from './read-out.ts';

interface Asked {
  id?: number | undefined;
  below?: number | undefined;
  q?: string | undefined;
  leatherId?: number | undefined;
  onRack?: 'yes' | 'no' | undefined;
  ours?: 'yes' | undefined;
  limit?: number;
}

interface Row {
  id: number;
  tag: string;
  leather_id: number;
  leather_name: string;
  form: LotReply['form'];
  measured_area_mm2: number;
  pieces: number;
  width_mm: number | null;
  height_mm: number | null;
  weight_oz: number | null;
  cost: number;
  grade: string;
  shade: string;
  place: string;
  supplier_lot: string;
  received_on: string;
  purchase_order_id: number | null;
  purchase_order_number: string | null;
  on_hand: number;
  reserved: number;
  value: number;
  version: number;
}

const measured = `
  SELECT lot.*, leather.name AS leather_name,
    p.id AS purchase_order_id, p.number AS purchase_order_number,
    COALESCE(b.on_hand, 0) AS on_hand,
    COALESCE(b.reserved, 0) AS reserved,
    COALESCE((SELECT SUM(m.value) FROM stock_movement m WHERE m.lot_id = lot.id), 0) AS value
  FROM lot
  JOIN leather ON leather.id = lot.leather_id
  LEFT JOIN purchase_line l ON l.id = lot.purchase_line_id
  LEFT JOIN purchase_order p ON p.id = l.purchase_order_id
  LEFT JOIN stock_balance b ON b.lot_id = lot.id`;

/** Lots with what is left of them, newest first. */
export async function readLotList(em: EntityManager, asked: Asked): Promise<LotReply[]> {
  const { where, values } = whereAll([
    ...when(asked.id, 'id = ?'),
    ...when(asked.below, 'id < ?'),
    ...when(asked.leatherId, 'leather_id = ?'),
    ...when(asked.q, 'tag LIKE ? OR leather_name LIKE ? OR place LIKE ?', (q) =>
      Array<string>(3).fill(`%${q}%`),
    ),
    ...when(asked.onRack, '(on_hand > 0) = ?', (onRack) => [onRack === 'yes' ? 1 : 0]),
    ...when(asked.ours, `on_hand > 0 OR id IN (SELECT l.from_lot_id FROM ${linesOut})`, () => []),
  ]);
  const sql = `SELECT * FROM (${measured}) ${where} ORDER BY id DESC LIMIT ?`;
  const rows = await em.execute<Row[]>(sql, [...values, asked.limit ?? 1]);
  const outOf = await readOut(
    em,
    rows.map(({ id }) => id),
  );
  return rows.map((row) => toReply(row, outOf(row.id)));
}

/** @throws {Problem} 404 */
export async function readOneLot(em: EntityManager, id: number): Promise<LotReply> {
  const [found] = await readLotList(em, { id });
  if (found === undefined) throw notFound('lot');
  return found;
}

const areaText = (thousandths: number) => unscaled(thousandths, 3).toFixed();
const lengthText = (nanometres: number | null) =>
  nanometres === null ? null : unscaled(nanometres, 6).toFixed();

function toReply(row: Row, outFor: LotReply['outFor']): LotReply {
  return {
    id: row.id,
    tag: row.tag,
    leatherId: row.leather_id,
    leatherName: row.leather_name,
    form: row.form,
    measuredAreaMm2: areaText(row.measured_area_mm2),
    pieces: row.pieces,
    widthMm: lengthText(row.width_mm),
    heightMm: lengthText(row.height_mm),
    weightOz: row.weight_oz === null ? null : unscaled(row.weight_oz, 3).toFixed(),
    cost: moneyText(unscaled(row.cost, 2)),
    grade: row.grade,
    shade: row.shade,
    place: row.place,
    supplierLot: row.supplier_lot,
    receivedOn: row.received_on,
    purchaseOrderId: row.purchase_order_id,
    purchaseOrderNumber: row.purchase_order_number,
    onHandAreaMm2: areaText(row.on_hand),
    reservedAreaMm2: areaText(row.reserved),
    freeAreaMm2: areaText(Math.max(0, row.on_hand - row.reserved)),
    outFor,
    valueOnHand: moneyText(unscaled(row.value, 2)),
    version: row.version,
  };
}

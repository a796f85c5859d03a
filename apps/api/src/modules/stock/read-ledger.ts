import type { EntityManager } from '@mikro-orm/sqlite';
import type { StockMovement, StockReservation } from '@hidewright/contract';
import { unscaled } from '../../db/columns/scaled-decimal.ts';
import { when, whereAll } from '../../db/sql-conditions.ts';
import { moneyText } from '../../http/decimal-text.ts';

interface Asked {
  id?: number | undefined;
  below?: number | undefined;
  lotId?: number | undefined;
  hardwareId?: number | undefined;
  jobId?: number | undefined;
  limit: number;
}

export interface AskedMovements extends Asked {
  leatherId?: number | undefined;
  orderId?: number | undefined;
  purchaseOrderId?: number | undefined;
  kind?: StockMovement['kind'] | undefined;
  person?: string | undefined;
  from?: string | undefined;
  to?: string | undefined;
}

interface ItemRow {
  id: number;
  lot_id: number | null;
  lot_tag: string | null;
  hardware_id: number | null;
  hardware_name: string | null;
}

interface MovementRow extends ItemRow {
  at: string;
  day: string;
  kind: StockMovement['kind'];
  quantity: number;
  value: number;
  job_id: number | null;
  job_number: string | null;
  purchase_order_id: number | null;
  purchase_order_number: string | null;
  reason: string;
  actor_name: string;
}

interface ReservationRow extends ItemRow {
  job_id: number;
  job_number: string;
  open: number;
}

const named = (table: string) => `
  FROM ${table} m
  LEFT JOIN lot ON lot.id = m.lot_id
  LEFT JOIN hardware h ON h.id = m.hardware_id
  LEFT JOIN job ON job.id = m.job_id`;

const conditionsOf = (asked: Asked) => [
  ...when(asked.id, 'm.id = ?'),
  ...when(asked.below, 'm.id < ?'),
  ...when(asked.lotId, 'm.lot_id = ?'),
  ...when(asked.hardwareId, 'm.hardware_id = ?'),
  ...when(asked.jobId, 'm.job_id = ?'),
];

/** Movements of the ledger with every name in them, newest first. */
export async function readMovements(
  em: EntityManager,
  asked: AskedMovements,
): Promise<StockMovement[]> {
  const { where, values } = whereAll([
    ...conditionsOf(asked),
    ...when(asked.leatherId, 'lot.leather_id = ?'),
    ...when(asked.orderId, 'job.order_id = ?'),
    ...when(asked.purchaseOrderId, 'm.purchase_order_id = ?'),
    ...when(asked.kind, 'm.kind = ?'),
    ...when(asked.person, 'm.actor_name LIKE ?', (person) => [`%${person}%`]),
    ...when(asked.from, 'm.day >= ?'),
    ...when(asked.to, 'm.day <= ?'),
  ]);
  const rows = await em.execute<MovementRow[]>(
    `SELECT m.*, lot.tag AS lot_tag, h.name AS hardware_name, job.number AS job_number,
       p.number AS purchase_order_number
     ${named('stock_movement')}
     LEFT JOIN purchase_order p ON p.id = m.purchase_order_id
     ${where} ORDER BY m.id DESC LIMIT ?`,
    [...values, asked.limit],
  );
  return rows.map((row) => ({
    ...itemOf(row, row.quantity),
    at: row.at,
    day: row.day,
    kind: row.kind,
    value: moneyText(unscaled(row.value, 2)),
    jobId: row.job_id,
    jobNumber: row.job_number,
    purchaseOrderId: row.purchase_order_id,
    purchaseOrderNumber: row.purchase_order_number,
    reason: row.reason,
    actorName: row.actor_name,
  }));
}

/** What is still held for jobs, newest first. */
export async function readReservations(
  em: EntityManager,
  asked: Asked,
): Promise<StockReservation[]> {
  return reservationsWhere(em, conditionsOf(asked), asked.limit);
}

/** What is still held for jobs of any of these things, newest first. */
export async function readReservationsOf(
  em: EntityManager,
  { lotIds, hardwareIds }: { lotIds: readonly number[]; hardwareIds: readonly number[] },
): Promise<StockReservation[]> {
  if (lotIds.length + hardwareIds.length === 0) return [];
  const any = `(m.lot_id IN (SELECT value FROM json_each(?)) OR m.hardware_id IN (SELECT value FROM json_each(?)))`;
  const values = [JSON.stringify(lotIds), JSON.stringify(hardwareIds)];
  return reservationsWhere(em, [{ sql: any, values }], -1);
}

async function reservationsWhere(
  em: EntityManager,
  conditions: ReturnType<typeof conditionsOf>,
  limit: number,
): Promise<StockReservation[]> {
  const { where, values } = whereAll([{ sql: 'm.open > 0', values: [] }, ...conditions]);
  const rows = await em.execute<ReservationRow[]>(
    `SELECT m.*, lot.tag AS lot_tag, h.name AS hardware_name, job.number AS job_number
     ${named('reservation')} ${where} ORDER BY m.id DESC LIMIT ?`,
    [...values, limit],
  );
  return rows.map((row) => ({
    ...itemOf(row, row.open),
    jobId: row.job_id,
    jobNumber: row.job_number,
  }));
}

function itemOf(row: ItemRow, quantity: number) {
  const ofLot = row.lot_id !== null;
  return {
    id: row.id,
    lotId: row.lot_id,
    lotTag: row.lot_tag,
    hardwareId: row.hardware_id,
    hardwareName: row.hardware_name,
    areaMm2: ofLot ? unscaled(quantity, 3).toFixed() : null,
    quantity: ofLot ? null : quantity,
  };
}

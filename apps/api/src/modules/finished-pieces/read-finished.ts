import type { FinishedMovement, FinishedPiece } from '@hidewright/contract';
import type { EntityManager } from '@mikro-orm/sqlite';
import { unscaled } from '../../db/columns/scaled-decimal.ts';
import { when, whereAll } from '../../db/sql-conditions.ts';
import { moneyText } from '../../http/decimal-text.ts';
import { notFound } from '../../http/problem.ts';

interface Asked {
  id?: number | undefined;
  below?: number | undefined;
  patternId?: number | readonly number[] | undefined;
  there?: 'yes' | 'no' | undefined;
  forCustomer?: number | undefined;
  q?: string | undefined;
  limit: number;
}

interface Row {
  id: number;
  pattern_id: number;
  pattern_name: string;
  option_name: string;
  sort: FinishedPiece['sort'];
  customer_id: number | null;
  customer_name: string | null;
  on_hand: number;
  value: number;
  place: string;
  version: number;
}

/** Finished pieces with every name, newest kind first. */
export async function readFinishedList(em: EntityManager, asked: Asked): Promise<FinishedPiece[]> {
  const { where, values } = whereAll([
    ...when(asked.id, 'f.id = ?'),
    ...when(asked.below, 'f.id < ?'),
    ...when(
      asked.patternId === undefined ? undefined : JSON.stringify([asked.patternId].flat()),
      'f.pattern_id IN (SELECT value FROM json_each(?))',
    ),
    ...when(asked.there, '(f.on_hand > 0) = ?', (there) => [there === 'yes' ? 1 : 0]),
    ...when(asked.forCustomer, 'COALESCE(f.customer_id, ?) = ?', (id) => [id, id]),
    ...when(asked.q, '(p.name LIKE ? OR c.name LIKE ?)', (q) => [`%${q}%`, `%${q}%`]),
  ]);
  const rows = await em.execute<Row[]>(
    `SELECT f.*, p.name AS pattern_name, c.name AS customer_name FROM finished_piece f
      JOIN pattern p ON p.id = f.pattern_id LEFT JOIN customer c ON c.id = f.customer_id
    ${where} ORDER BY f.id DESC LIMIT ?`,
    [...values, asked.limit],
  );
  return rows.map(toReply);
}

/** @throws {Problem} 404 */
export async function readOneFinished(em: EntityManager, id: number): Promise<FinishedPiece> {
  const [found] = await readFinishedList(em, { id, limit: 1 });
  if (found === undefined) throw notFound('kind of finished piece');
  return found;
}

function toReply(row: Row): FinishedPiece {
  const value = unscaled(row.value, 2);
  return {
    id: row.id,
    patternId: row.pattern_id,
    patternName: row.pattern_name,
    option: row.option_name === '' ? null : row.option_name,
    sort: row.sort,
    customerId: row.customer_id,
    customerName: row.customer_name,
    onHand: row.on_hand,
    place: row.place,
    value: moneyText(value),
    valueEach: row.on_hand === 0 ? null : moneyText(value.dividedBy(row.on_hand)),
    version: row.version,
  };
}

interface MovementRow {
  id: number;
  at: string;
  day: string;
  kind: FinishedMovement['kind'];
  quantity: number;
  value: number;
  job_id: number | null;
  job_number: string | null;
  invoice_id: number | null;
  invoice_number: string | null;
  reason: string;
  actor_name: string;
}

export async function readFinishedMovements(
  em: EntityManager,
  asked: { pieceId: number; below?: number | undefined; limit: number },
): Promise<FinishedMovement[]> {
  const { where, values } = whereAll([
    ...when(asked.pieceId, 'm.finished_piece_id = ?'),
    ...when(asked.below, 'm.id < ?'),
  ]);
  const rows = await em.execute<MovementRow[]>(
    `SELECT m.*, j.number AS job_number, i.id AS invoice_id, i.number AS invoice_number
    FROM finished_movement m LEFT JOIN job j ON j.id = m.job_id
      LEFT JOIN shelf_sale s ON s.id = m.shelf_sale_id LEFT JOIN invoice_line l ON l.id = s.invoice_line_id
      LEFT JOIN invoice i ON i.id = l.invoice_id
    ${where} ORDER BY m.id DESC LIMIT ?`,
    [...values, asked.limit],
  );
  return rows.map((row) => ({
    id: row.id,
    at: row.at,
    day: row.day,
    kind: row.kind,
    quantity: row.quantity,
    value: moneyText(unscaled(row.value, 2)),
    jobId: row.job_id,
    jobNumber: row.job_number,
    invoice: row.invoice_id === null ? null : { id: row.invoice_id, number: row.invoice_number },
    reason: row.reason,
    actorName: row.actor_name,
  }));
}

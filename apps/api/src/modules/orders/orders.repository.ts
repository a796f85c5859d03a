import type { EntityManager } from '@mikro-orm/sqlite';
import type { Awaited, Job, Order, OrderState } from '@hidewright/contract';
import { unscaled } from '../../db/columns/scaled-decimal.ts';
import { moneyText, priceText } from '../../http/decimal-text.ts';
import { notFound } from '../../http/problem.ts';

interface OrderRow {
  id: number;
  number: string;
  state: OrderState;
  awaits: string;
  quote_id: number;
  quote_number: string;
  customer_id: number;
  customer_name: string;
  pattern_id: number;
  pattern_name: string;
  title: string;
  quantity: number;
  price_each: number;
  goods_total: number;
  tooling_charge: number;
  option_name: string | null;
  charges: string;
  total: number;
  in_hands_on: string | null;
  promised_on: string;
  taken_on_at: string;
  shipped_on: string | null;
  job_id: number;
  job_number: string;
  job_state: Job['state'];
  cut_count: number;
  good: number;
  seconds: number;
  invoice_id: number | null;
  invoice_number: string | null;
  invoice_state: string | null;
  moves: string;
  cancellation: string | null;
  version: number;
}

const joined = `
  SELECT o.*, q.number AS quote_number, c.name AS customer_name, p.id AS pattern_id, p.name AS pattern_name,
    j.id AS job_id, j.number AS job_number, j.state AS job_state, j.cut_count, j.good, j.seconds,
    i.id AS invoice_id, i.number AS invoice_number, i.state AS invoice_state,
    (SELECT json_group_array(json_object('fromDay', from_day, 'toDay', to_day, 'why', why, 'at', at, 'by', actor_name))
      FROM (SELECT * FROM promise_move WHERE order_id = o.id ORDER BY id)) AS moves,
    (SELECT json_object('at', at, 'by', actor_name, 'why', why) FROM order_cancellation WHERE order_id = o.id)
      AS cancellation
  FROM customer_order o
  JOIN quote q ON q.id = o.quote_id
  JOIN customer c ON c.id = o.customer_id
  JOIN job j ON j.order_id = o.id
  JOIN pattern_version v ON v.id = j.pattern_version_id
  JOIN pattern p ON p.id = v.pattern_id
  LEFT JOIN invoice i ON i.id = (SELECT max(id) FROM invoice WHERE order_id = o.id)`;

export interface OrderFilter {
  below: number | undefined;
  limit: number;
  q: string | undefined;
  state: OrderState | undefined;
  open: boolean | undefined;
  customerId: number | undefined;
}

const over = `o.state IN ('shipped', 'closed', 'cancelled')`;

/** Orders, newest first, one more than the limit where there are more. */
export async function findOrders(em: EntityManager, filter: OrderFilter): Promise<Order[]> {
  const conditions: string[] = [];
  const values: (string | number)[] = [];
  const where = (condition: string, ...given: (string | number)[]) => {
    conditions.push(condition);
    values.push(...given);
  };
  if (filter.below !== undefined) where('o.id < ?', filter.below);
  if (filter.state !== undefined) where('o.state = ?', filter.state);
  if (filter.open !== undefined) where(filter.open ? `NOT ${over}` : over);
  if (filter.customerId !== undefined) where('o.customer_id = ?', filter.customerId);
  if (filter.q !== undefined) {
    const like = `%${filter.q}%`;
    where(
      '(o.number LIKE ? OR o.title LIKE ? OR c.name LIKE ? OR j.number LIKE ? OR q.number LIKE ?)',
      like,
      like,
      like,
      like,
      like,
    );
  }
  const sql = `${joined} ${conditions.length > 0 ? `WHERE ${conditions.join(' AND ')}` : ''} ORDER BY o.id DESC LIMIT ?`;
  const rows = await em.execute<OrderRow[]>(sql, [...values, filter.limit + 1]);
  return rows.map(toReply);
}

/** @throws {Problem} 404 */
export async function readOrderReply(em: EntityManager, id: number): Promise<Order> {
  const [row] = await em.execute<OrderRow[]>(`${joined} WHERE o.id = ?`, [id]);
  if (row === undefined) throw notFound('order');
  return toReply(row);
}

function toReply(row: OrderRow): Order {
  return {
    id: row.id,
    number: row.number,
    state: row.state,
    awaits: JSON.parse(row.awaits) as Awaited[],
    quoteId: row.quote_id,
    quoteNumber: row.quote_number,
    customerId: row.customer_id,
    customerName: row.customer_name,
    patternId: row.pattern_id,
    patternName: row.pattern_name,
    title: row.title,
    quantity: row.quantity,
    priceEach: priceText(unscaled(row.price_each, 4)),
    goodsTotal: moneyText(unscaled(row.goods_total, 2)),
    toolingCharge: moneyText(unscaled(row.tooling_charge, 2)),
    optionName: row.option_name,
    charges: JSON.parse(row.charges) as Order['charges'],
    total: moneyText(unscaled(row.total, 2)),
    inHandsOn: row.in_hands_on,
    promisedOn: row.promised_on,
    takenOnAt: row.taken_on_at,
    shippedOn: row.shipped_on,
    moves: JSON.parse(row.moves) as Order['moves'],
    cancellation:
      row.cancellation === null ? null : (JSON.parse(row.cancellation) as Order['cancellation']),
    job: {
      id: row.job_id,
      number: row.job_number,
      state: row.job_state,
      cutCount: row.cut_count,
      good: row.good,
      seconds: row.seconds,
    },
    invoice: invoiceOf(row),
    version: row.version,
  };
}

function invoiceOf(row: OrderRow): Order['invoice'] {
  if (row.invoice_id === null || row.invoice_state === null) return null;
  return { id: row.invoice_id, number: row.invoice_number, state: row.invoice_state };
}

import type { QuoteRow, QuoteState } from '@hidewright/contract';
import { readCursor, toPage } from '../../http/paging.ts';
import { moneyText } from '../../http/decimal-text.ts';
import { unscaled } from '../../db/columns/scaled-decimal.ts';
import type { Work } from '../../work.ts';

interface Asked {
  cursor?: string | undefined;
  limit: number;
  q?: string | undefined;
  state?: QuoteState | undefined;
  customerId?: number | undefined;
}

interface Found {
  id: number;
  number: string;
  revision: number;
  state: QuoteState;
  customer_id: number;
  customer_name: string;
  pattern_id: number;
  pattern_name: string;
  title: string;
  in_hands_on: string | null;
  valid_until: string | null;
  created_at: string;
  sent_at: string | null;
  agreed_at: string | null;
  agreed_quantity: number | null;
  agreed_how: QuoteRow['agreedHow'];
  order_id: number | null;
  order_number: string | null;
  quantities: string;
  total: number;
}

const chosen = `
  SELECT q.id, q.number, q.revision, q.state, q.customer_id, c.name AS customer_name,
    v.pattern_id, p.name AS pattern_name, q.title, q.in_hands_on, q.valid_until, q.created_at,
    q.sent_at, q.agreed_at, q.agreed_quantity, q.agreed_how, o.id AS order_id, o.number AS order_number,
    (SELECT json_group_array(quantity) FROM (SELECT quantity FROM quote_break WHERE quote_id = q.id ORDER BY quantity)) AS quantities,
    COALESCE(
      (SELECT CAST(ROUND(json_extract(rung.value, '$.total') * 100) AS INTEGER)
        FROM json_each(q.numbers, '$.options') option, json_each(option.value, '$.breaks') rung
        WHERE json_extract(option.value, '$.name') = q.agreed_option
          AND json_extract(rung.value, '$.quantity') = q.agreed_quantity),
      (SELECT total FROM quote_break WHERE quote_id = q.id
        ORDER BY quantity = q.agreed_quantity DESC, quantity DESC LIMIT 1)) AS total
  FROM quote q
  JOIN customer c ON c.id = q.customer_id
  JOIN pattern_version v ON v.id = q.pattern_version_id
  JOIN pattern p ON p.id = v.pattern_id
  LEFT JOIN customer_order o ON o.quote_id = q.id`;

/** A page of quotes, newest first, with the names that a list shows. */
export async function listQuoteRows(
  work: Work,
  asked: Asked,
): Promise<{ items: QuoteRow[]; next: string | null }> {
  const { where, values } = conditions(asked);
  const sql = `${chosen} ${where} ORDER BY q.id DESC LIMIT ?`;
  const rows = await work.em
    .getConnection()
    .execute<Found[]>(sql, [...values, asked.limit + 1], 'all', work.em.getTransactionContext());
  const { items, next } = toPage(rows, asked.limit, (row) => row.id);
  return { items: items.map(toRow), next };
}

function conditions(asked: Asked): { where: string; values: (string | number)[] } {
  const below = readCursor(asked.cursor);
  const parts: [string, (string | number)[]][] = [];
  if (below !== undefined) parts.push(['q.id < ?', [below]]);
  if (asked.state !== undefined) parts.push(['q.state = ?', [asked.state]]);
  if (asked.customerId !== undefined) parts.push(['q.customer_id = ?', [asked.customerId]]);
  if (asked.q !== undefined && asked.q !== '') {
    const like = `%${asked.q}%`;
    parts.push([
      '(q.number LIKE ? OR q.title LIKE ? OR c.name LIKE ? OR p.name LIKE ?)',
      [like, like, like, like],
    ]);
  }
  if (parts.length === 0) return { where: '', values: [] };
  return {
    where: `WHERE ${parts.map(([sql]) => sql).join(' AND ')}`,
    values: parts.flatMap(([, values]) => values),
  };
}

function toRow(row: Found): QuoteRow {
  return {
    id: row.id,
    number: row.number,
    revision: row.revision,
    state: row.state,
    customerId: row.customer_id,
    customerName: row.customer_name,
    patternId: row.pattern_id,
    patternName: row.pattern_name,
    title: row.title,
    inHandsOn: row.in_hands_on,
    validUntil: row.valid_until,
    createdAt: row.created_at,
    sentAt: row.sent_at,
    agreedAt: row.agreed_at,
    agreedQuantity: row.agreed_quantity,
    agreedHow: row.agreed_how,
    orderId: row.order_id,
    orderNumber: row.order_number,
    quantities: JSON.parse(row.quantities) as number[],
    total: moneyText(unscaled(row.total, 2)),
  };
}

import type { Found } from '@hidewright/contract';
import type { Actor } from '../../work.ts';

interface Source {
  kind: Found['kind'];
  roles: readonly Actor['role'][];
  /** Two places for the pattern; the newest first, a handful of each kind. */
  sql: string;
  to: (key: string) => string;
}

const everybody = ['owner', 'maker', 'bookkeeper'] as const;
const desk = ['owner', 'bookkeeper'] as const;

const sources: Source[] = [
  {
    kind: 'quote',
    roles: everybody,
    sql: `SELECT q.id AS key, q.number || ' · ' || q.title AS label, c.name || ' · ' || q.state AS detail
      FROM quote q JOIN customer c ON c.id = q.customer_id
      WHERE q.number LIKE ? ESCAPE '\\' OR q.title LIKE ? ESCAPE '\\' ORDER BY q.id DESC LIMIT 5`,
    to: (key) => `/counter/quotes/${key}`,
  },
  {
    kind: 'order',
    roles: desk,
    sql: `SELECT o.id AS key, o.number || ' · ' || o.title AS label, c.name || ' · ' || o.state AS detail
      FROM customer_order o JOIN customer c ON c.id = o.customer_id
      WHERE o.number LIKE ? ESCAPE '\\' OR o.title LIKE ? ESCAPE '\\' ORDER BY o.id DESC LIMIT 5`,
    to: (key) => `/counter/orders/${key}`,
  },
  {
    kind: 'job',
    roles: everybody,
    sql: `SELECT j.id AS key, j.number || ' · ' || o.title AS label,
        CASE o.state WHEN 'cancelled' THEN 'cancelled' ELSE j.state END AS detail
      FROM job j JOIN customer_order o ON o.id = j.order_id
      WHERE j.number LIKE ? ESCAPE '\\' OR o.title LIKE ? ESCAPE '\\' ORDER BY j.id DESC LIMIT 5`,
    to: (key) => `/bench/jobs/${key}`,
  },
  {
    kind: 'invoice',
    roles: desk,
    sql: `SELECT i.id AS key, i.number AS label, c.name || ' · ' || i.state AS detail
      FROM invoice i JOIN customer c ON c.id = i.customer_id
      WHERE i.number LIKE ? ESCAPE '\\' OR (i.number IS NOT NULL AND c.name LIKE ? ESCAPE '\\') ORDER BY i.id DESC LIMIT 5`,
    to: (key) => `/books/invoices/${key}`,
  },
  {
    kind: 'customer',
    roles: desk,
    sql: `SELECT id AS key, name AS label, 'customer' AS detail FROM customer
      WHERE name LIKE ? ESCAPE '\\' OR contact_name LIKE ? ESCAPE '\\' ORDER BY name LIMIT 5`,
    to: (key) => `/counter/customers/${key}`,
  },
  {
    kind: 'pattern',
    roles: ['owner', 'maker'],
    sql: `SELECT id AS key, name AS label, 'pattern' AS detail FROM pattern
      WHERE name LIKE ? ESCAPE '\\' OR name LIKE ? ESCAPE '\\' ORDER BY name LIMIT 5`,
    to: (key) => `/pattern-room/patterns/${key}`,
  },
  {
    kind: 'lot',
    roles: ['owner', 'maker'],
    sql: `SELECT l.id AS key, l.tag AS label, r.name || ' · ' || l.form AS detail
      FROM lot l JOIN leather r ON r.id = l.leather_id
      WHERE l.tag LIKE ? ESCAPE '\\' OR r.name LIKE ? ESCAPE '\\' ORDER BY l.id DESC LIMIT 5`,
    to: (key) => `/stockroom/lots/${key}`,
  },
  {
    kind: 'hardware',
    roles: ['owner', 'maker'],
    sql: `SELECT h.id AS key, h.name AS label, h.kind || ' · ' ||
        CASE WHEN EXISTS (SELECT 1 FROM kit_part k WHERE k.kit_id = h.id) THEN 'a kit'
          ELSE COALESCE(b.on_hand, 0) || ' on hand' END AS detail
      FROM hardware h LEFT JOIN stock_balance b ON b.hardware_id = h.id
      WHERE h.name LIKE ? ESCAPE '\\' OR h.kind LIKE ? ESCAPE '\\' ORDER BY h.name LIMIT 5`,
    to: (key) => `/stockroom/hardware/${key}`,
  },
  {
    kind: 'purchase order',
    roles: everybody,
    sql: `SELECT p.id AS key, p.number AS label, s.name || ' · ' || p.state AS detail
      FROM purchase_order p JOIN supplier s ON s.id = p.supplier_id
      WHERE p.number LIKE ? ESCAPE '\\' OR s.name LIKE ? ESCAPE '\\' ORDER BY p.id DESC LIMIT 5`,
    to: (key) => `/stockroom/purchase-orders/${key}`,
  },
];

/** What a role may find: nothing that it could not open. */
export function sourcesFor(role: Actor['role']): Source[] {
  return sources.filter((source) => source.roles.includes(role));
}

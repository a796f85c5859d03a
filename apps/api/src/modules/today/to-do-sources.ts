import {
  draftOrders,
  handedInCounts,
  notAtItsPrice,
  openCounts,
  sentBack,
  shortOfMark,
} from './stockroom-sources.ts';
import { by, past, type Source } from './to-do-source.ts';

export const sources: Source[] = [
  {
    roles: ['owner'],
    sql: `SELECT q.id, q.number, q.title, c.name AS customer, q.in_hands_on AS day, q.agreed_quantity AS extra
      FROM quote q JOIN customer c ON c.id = q.customer_id LEFT JOIN customer_order o ON o.quote_id = q.id
      WHERE q.state = 'agreed' AND o.id IS NULL ORDER BY q.in_hands_on, q.id LIMIT 6`,
    say: (row, today) => ({
      kind: 'take on',
      title: 'Take on',
      detail: `${row.customer} agreed to ${row.extra ?? ''} ${row.title}`,
      when: by('in hands', row.day),
      late: past(row.day, today),
      action: 'Can we make it?',
      to: `/counter/quotes/${row.id}`,
    }),
  },
  {
    roles: ['owner', 'maker'],
    sql: `SELECT COALESCE(b.lot_id, b.hardware_id) AS id, CASE WHEN b.lot_id IS NULL THEN 'hardware' ELSE 'lots' END AS number,
        COALESCE(l.tag || ' ' || leather.name, h.name) AS title, '' AS customer,
        MIN(o.promised_on) AS day, group_concat(DISTINCT j.number) AS extra
      FROM stock_balance b
        JOIN reservation r ON r.lot_id IS b.lot_id AND r.hardware_id IS b.hardware_id AND r.open > 0
        JOIN job j ON j.id = r.job_id JOIN customer_order o ON o.id = j.order_id
        LEFT JOIN lot l ON l.id = b.lot_id LEFT JOIN leather ON leather.id = l.leather_id
        LEFT JOIN hardware h ON h.id = b.hardware_id
      WHERE b.reserved > b.on_hand GROUP BY b.id ORDER BY day, b.id LIMIT 4`,
    say: (row, today) => ({
      kind: 'too little',
      title: 'Less there than is held',
      detail: `${row.title}: a count found less than is held for ${(row.extra ?? '').split(',').join(' and ')}`,
      when: by('promised for', row.day),
      late: past(row.day, today),
      action: 'Look',
      to: `/stockroom/${row.number}/${row.id}`,
    }),
  },
  handedInCounts,
  {
    roles: ['maker'],
    sql: `SELECT j.id, j.number, o.title, c.name AS customer, o.promised_on AS day, j.state AS extra
      FROM job j JOIN customer_order o ON o.id = j.order_id JOIN customer c ON c.id = o.customer_id
      WHERE j.state IN ('at the bench', 'ready', 'paused') AND o.state <> 'cancelled'
      ORDER BY CASE j.state WHEN 'at the bench' THEN 0 ELSE 1 END, o.promised_on, j.id LIMIT 6`,
    say: (row, today) => ({
      kind: 'make',
      title: row.title,
      detail: `${row.number} for ${row.customer}, ${row.extra ?? ''}`,
      when: by('promised for', row.day),
      late: past(row.day, today),
      action: row.extra === 'ready' ? 'Begin' : 'Go on',
      to: `/bench/jobs/${row.id}`,
    }),
  },
  openCounts,
  {
    roles: ['maker'],
    sql: `SELECT q.id, q.number, q.title, c.name AS customer, q.in_hands_on AS day, q.agreed_quantity AS extra
      FROM quote q JOIN customer c ON c.id = q.customer_id LEFT JOIN customer_order o ON o.quote_id = q.id
      WHERE q.state IN ('sent', 'agreed') AND o.id IS NULL ORDER BY q.state, q.id DESC LIMIT 4`,
    say: (row) => ({
      kind: 'check',
      title: 'Can we make it?',
      detail: `${row.extra === null ? '' : `${row.extra} `}${row.title} for ${row.customer}`,
      when: by('in hands', row.day),
      late: false,
      action: 'Check',
      to: `/bench/checks/${row.id}`,
    }),
  },
  {
    roles: ['owner'],
    sql: `SELECT o.id, o.number, o.title, c.name AS customer, o.promised_on AS day, o.awaits AS extra
      FROM customer_order o JOIN customer c ON c.id = o.customer_id
      WHERE o.state IN ('awaiting proof', 'awaiting deposit', 'awaiting tooling') ORDER BY o.promised_on LIMIT 5`,
    say: (row, today) => ({
      kind: 'clear',
      title: `Awaiting ${(JSON.parse(row.extra ?? '[]') as string[]).join(' and ')}`,
      detail: `${row.title} for ${row.customer}`,
      when: by('promised for', row.day),
      late: past(row.day, today),
      action: 'Look',
      to: `/counter/orders/${row.id}`,
    }),
  },
  {
    roles: ['owner', 'maker'],
    sql: `SELECT p.id, p.number, s.name AS title, s.name AS customer, p.state AS extra,
        (SELECT MIN(COALESCE(l.expected_on, p.expected_on)) FROM purchase_line l
          WHERE l.purchase_order_id = p.id AND l.received < l.quantity AND l.closed = 0) AS day
      FROM purchase_order p JOIN supplier s ON s.id = p.supplier_id
      WHERE p.state IN ('sent', 'part received') ORDER BY day LIMIT 4`,
    say: (row, today) => ({
      kind: 'receive',
      title: 'Receive',
      detail: `${row.number} from ${row.customer}`,
      when: by('expected', row.day),
      late: past(row.day, today),
      action: 'Receive',
      to: `/stockroom/purchase-orders/${row.id}`,
    }),
  },
  shortOfMark,
  sentBack,
  {
    roles: ['owner'],
    sql: `SELECT o.id, o.number, o.title, c.name AS customer, o.promised_on AS day, o.quantity AS extra
      FROM customer_order o JOIN customer c ON c.id = o.customer_id
      WHERE o.state IN ('packed', 'part shipped') ORDER BY o.promised_on LIMIT 5`,
    say: (row, today) => ({
      kind: 'ship',
      title: 'Ship',
      detail: `${row.extra ?? ''} ${row.title} for ${row.customer}`,
      when: by('promised for', row.day),
      late: past(row.day, today),
      action: 'Ship',
      to: `/counter/orders/${row.id}`,
    }),
  },
  {
    roles: ['owner', 'bookkeeper'],
    sql: `SELECT o.id, o.number, o.title, c.name AS customer, o.shipped_on AS day, NULL AS extra
      FROM customer_order o JOIN customer c ON c.id = o.customer_id LEFT JOIN invoice i ON i.order_id = o.id
      WHERE o.state IN ('packed', 'part shipped', 'shipped') AND (i.id IS NULL OR i.state = 'draft')
      ORDER BY o.shipped_on, o.id LIMIT 6`,
    say: (row) => ({
      kind: 'invoice',
      title: 'Invoice',
      detail: `${row.number}: ${row.title} for ${row.customer}`,
      when: by('shipped', row.day),
      late: false,
      action: 'Invoice',
      to: `/books/invoices/new?order=${row.id}`,
    }),
  },
  {
    roles: ['owner', 'bookkeeper'],
    sql: `SELECT i.id, i.number, i.number AS title, c.name AS customer, i.due_on AS day,
        printf('%.2f', (i.total - i.paid - i.credited) / 100.0) AS extra
      FROM invoice i JOIN customer c ON c.id = i.customer_id
      WHERE i.state IN ('issued', 'part paid') AND i.due_on < :today ORDER BY i.due_on LIMIT 6`,
    say: (row) => ({
      kind: 'remind',
      title: 'Overdue',
      detail: `${row.customer} owes ${row.extra ?? ''} on ${row.number}`,
      when: by('was due', row.day),
      late: true,
      action: 'Look',
      to: `/books/invoices/${row.id}`,
    }),
  },
  {
    roles: ['owner'],
    sql: `SELECT q.id, q.number, q.title, c.name AS customer, q.in_hands_on AS day, NULL AS extra
      FROM quote q JOIN customer c ON c.id = q.customer_id
      WHERE q.state = 'draft' ORDER BY q.in_hands_on IS NULL, q.in_hands_on, q.id LIMIT 4`,
    say: (row, today) => ({
      kind: 'answer',
      title: 'Answer',
      detail: `${row.number}: ${row.title} for ${row.customer}`,
      when: by('in hands', row.day),
      late: past(row.day, today),
      action: 'Quote',
      to: `/counter/quotes/${row.id}`,
    }),
  },
  draftOrders,
  {
    roles: ['owner'],
    sql: `SELECT t.id, t.number, t.kind || ' ' || t.number AS title, c.name AS customer,
        t.kept_until AS day, NULL AS extra
      FROM tool t JOIN customer c ON c.id = t.customer_id
      WHERE t.state = 'on the rack' AND t.owned_by = 'customer' AND t.kept_until <= :today
      ORDER BY t.kept_until, t.id LIMIT 4`,
    say: (row, today) => ({
      kind: 'give back',
      title: 'Give back or scrap',
      detail: `${row.customer}’s own ${row.title}`,
      when: by('kept until', row.day),
      late: past(row.day, today),
      action: 'Look',
      to: `/pattern-room/tooling/${row.id}`,
    }),
  },
  notAtItsPrice,
  {
    roles: ['bookkeeper'],
    sql: `SELECT 0 AS id, '' AS number, '' AS title, '' AS customer,
        date(:today, 'start of month', '-1 month') AS day, date(:today, 'start of month', '-1 day') AS extra
      WHERE EXISTS (SELECT 1 FROM posting
          WHERE day BETWEEN date(:today, 'start of month', '-1 month') AND date(:today, 'start of month', '-1 day'))
        AND NOT EXISTS (SELECT 1 FROM period WHERE to_day >= date(:today, 'start of month', '-1 day'))`,
    say: (row) => ({
      kind: 'lock',
      title: 'Sales sheet',
      detail: 'Last month is not locked yet',
      when: by('up to', row.extra),
      late: false,
      action: 'Open',
      to: `/books/sales-sheets?from=${row.day ?? ''}&to=${row.extra ?? ''}`,
    }),
  },
];

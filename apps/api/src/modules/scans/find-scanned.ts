import type { EntityManager } from '@mikro-orm/sqlite';
import type { Scanned } from '@hidewright/contract';
import { binTag, hardwareOfBin, scannedTag } from '@hidewright/domain';
import { Problem } from '../../http/problem.ts';

interface Source {
  kind: Scanned['kind'];
  sql: string;
  to: (id: number) => string;
}

/** Each finds by its tag whatever the case; what is written exactly so comes first. */
const sources: Source[] = [
  {
    kind: 'lot',
    sql: `SELECT lot.id, tag, leather.name AS name FROM lot JOIN leather ON leather.id = lot.leather_id
      WHERE tag = ? COLLATE NOCASE ORDER BY tag <> ? LIMIT 1`,
    to: (id) => `/stockroom/lots/${id}`,
  },
  {
    kind: 'purchase order',
    sql: `SELECT p.id, number AS tag, s.name AS name FROM purchase_order p JOIN supplier s ON s.id = p.supplier_id
      WHERE number = ? COLLATE NOCASE ORDER BY number <> ? LIMIT 1`,
    to: (id) => `/stockroom/purchase-orders/${id}`,
  },
  {
    kind: 'order',
    sql: `SELECT id, number AS tag, title AS name FROM customer_order
      WHERE number = ? COLLATE NOCASE ORDER BY number <> ? LIMIT 1`,
    to: (id) => `/counter/orders/${id}`,
  },
  {
    kind: 'job',
    sql: `SELECT j.id, j.number AS tag, o.title AS name FROM job j JOIN customer_order o ON o.id = j.order_id
      WHERE j.number = ? COLLATE NOCASE ORDER BY j.number <> ? LIMIT 1`,
    to: (id) => `/bench/jobs/${id}`,
  },
];

type Row = Pick<Scanned, 'id' | 'tag' | 'name'>;

/** @throws {Problem} 404 that says what was read and what to do */
export async function findScanned(em: EntityManager, code: string): Promise<Scanned> {
  const tag = scannedTag(code);
  if (tag === undefined) throw unknownTag(code);
  for (const { kind, sql, to } of sources) {
    const [row] = await em.execute<Row[]>(sql, [tag, tag]);
    if (row) return { kind, id: row.id, tag: row.tag, name: row.name, to: to(row.id) };
  }
  const bin = await findBin(em, tag);
  if (bin === undefined) throw unknownTag(tag);
  return bin;
}

async function findBin(em: EntityManager, tag: string): Promise<Scanned | undefined> {
  const id = hardwareOfBin(tag);
  if (id === undefined) return undefined;
  const [row] = await em.execute<Row[]>('SELECT id, name FROM hardware WHERE id = ?', [id]);
  if (row === undefined) return undefined;
  return { kind: 'hardware', id, tag: binTag(id), name: row.name, to: `/stockroom/hardware/${id}` };
}

function unknownTag(read: string): Problem {
  const shown = read.trim().slice(0, 60);
  return new Problem(
    404,
    'No such tag',
    `“${shown}” is on no lot, bin, order or ticket here. Scan it again, or type the tag as it is printed.`,
  );
}

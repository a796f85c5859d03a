import type { Context } from '../context.ts';

/**
 * A job of 100 pieces with nothing held or taken, its order without the quote it would come from, for tests of what
 * jobs hold and take; its id is `job`, its number J-9 and that.
 */
export async function writeBareJob(context: Context, job: number): Promise<number> {
  const connection = context.orm.em.fork().getConnection();
  await connection.execute('PRAGMA foreign_keys = OFF');
  await connection.execute(
    `INSERT INTO customer_order (id, number, quote_id, customer_id, title, quantity, price_each, goods_total,
       tooling_charge, total, state, awaits, promised_on, taken_on_at)
     VALUES (?, ?, ?, 1, '', 100, 0, 0, 0, 0, 'taken on', '[]', '2026-12-31', ?)`,
    [job, `O-9${job}`, job, context.clock.now().toISOString()],
  );
  await connection.execute(
    `INSERT INTO job (id, number, order_id, pattern_version_id, layout_id, state, quantity, cut_count, containers,
       planned_minutes, estimate, good, seconds)
     VALUES (?, ?, ?, 1, 1, 'ready', 100, 110, 6, 6000, '{}', 0, 0)`,
    [job, `J-9${job}`, job],
  );
  await connection.execute('PRAGMA foreign_keys = ON');
  return job;
}

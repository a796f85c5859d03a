import type { Context } from '../context.ts';

/**
 * A job of 100 pieces with nothing held or taken, without the order it would come from, for tests of what jobs hold
 * and take; its id is `job`, its number J-9 and that.
 */
export async function writeBareJob(context: Context, job: number): Promise<number> {
  const connection = context.orm.em.fork().getConnection();
  await connection.execute('PRAGMA foreign_keys = OFF');
  await connection.execute(
    `INSERT INTO job (id, number, order_id, pattern_version_id, layout_id, state, quantity, cut_count, containers,
       planned_minutes, estimate, good, seconds)
     VALUES (?, ?, ?, 1, 1, 'ready', 100, 110, 6, 6000, '{}', 0, 0)`,
    [job, `J-9${job}`, job],
  );
  await connection.execute('PRAGMA foreign_keys = ON');
  return job;
}

import type { MikroORM } from '@mikro-orm/sqlite';

const oldestSafe = [3, 51, 3] as const;

/** SQLite before 3.51.3 can corrupt a database in WAL mode (sqlite.org/wal.html), and without FULL it can lose what was acknowledged. */
export async function assertSound(orm: MikroORM): Promise<void> {
  const connection = orm.em.getConnection();
  const [row] = await connection.execute<[{ version: string }]>(
    'SELECT sqlite_version() AS version',
  );
  if (!atLeast(row.version, oldestSafe)) {
    throw new Error(
      `Hidewright needs SQLite ${oldestSafe.join('.')} or later; this is ${row.version}. Reinstall.`,
    );
  }
}

function atLeast(version: string, oldest: readonly number[]): boolean {
  const parts = version.split('.').map(Number);
  for (const [place, least] of oldest.entries()) {
    const part = parts[place] ?? 0;
    if (part !== least) return part > least;
  }
  return true;
}

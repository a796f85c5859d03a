/** What the sqlite3 driver's connection offers; its own types do not cover what we wrap. */
interface RawConnection {
  run(sql: string, ...rest: unknown[]): unknown;
  all(sql: string, ...rest: unknown[]): unknown;
  exec(sql: string, done: (error: Error | null) => void): unknown;
}

const pragmas = (synchronous: 'FULL' | 'OFF') => `
  PRAGMA journal_mode = WAL;
  PRAGMA synchronous = ${synchronous};
  PRAGMA foreign_keys = ON;
  PRAGMA busy_timeout = 10000;
`;

/** knex begins with a plain BEGIN, which takes the write lock only at the first write, and may then lose the race for it. */
function beginImmediate(connection: RawConnection, method: 'run' | 'all'): void {
  const original = connection[method].bind(connection);
  connection[method] = (sql: string, ...rest: unknown[]) =>
    original(sql === 'BEGIN;' ? 'BEGIN IMMEDIATE;' : sql, ...rest);
}

/** The one write connection: every write goes through it, one transaction at a time. */
export function writePool(synchronous: 'FULL' | 'OFF') {
  return {
    min: 1,
    max: 1,
    afterCreate(connection: unknown, done: (error: Error | null, connection: unknown) => void) {
      const raw = connection as RawConnection;
      beginImmediate(raw, 'run');
      beginImmediate(raw, 'all');
      raw.exec(pragmas(synchronous), (error) => {
        done(error, connection);
      });
    },
  };
}

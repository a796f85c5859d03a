import { createRequire } from 'node:module';
import path from 'node:path';

interface Connection {
  all(sql: string, params: unknown[], done: (error: Error | null, rows: Row[]) => void): void;
  close(done: () => void): void;
}

type Row = Record<string, string | number | null>;

/** The database without the program: the same driver, and nothing between. */
export class RawDatabase {
  readonly #connection: Connection;

  constructor(dataDir: string) {
    const api = createRequire(new URL('../../apps/api/package.json', import.meta.url));
    const knex = createRequire(api.resolve('@mikro-orm/sqlite')).resolve('@mikro-orm/knex');
    const { Database } = createRequire(knex)('sqlite3') as {
      Database: new (file: string) => Connection;
    };
    this.#connection = new Database(path.join(dataDir, 'hidewright.sqlite'));
  }

  all(sql: string, params: unknown[] = []): Promise<Row[]> {
    return new Promise((resolve, reject) => {
      this.#connection.all(sql, params, (error, rows) => (error ? reject(error) : resolve(rows)));
    });
  }

  /**
   * So many rows like one that is there, numbered by `n` from 1; columns may be another SQL expression of `n`.
   * The id goes on from the highest one.
   */
  async multiply(
    table: string,
    likeId: number,
    count: number,
    columns: Record<string, string>,
  ): Promise<void> {
    const named = await this.all(`SELECT name FROM pragma_table_info('${table}')`);
    const names = named.map(({ name }) => String(name));
    const [top] = await this.all(`SELECT MAX(id) AS id FROM ${table}`);
    const values = names.map((name) => {
      if (name === 'id') return `${Number(top?.['id'])} + n`;
      return columns[name] ?? `t.${name}`;
    });
    await this.all(
      `WITH RECURSIVE row (n) AS (SELECT 1 UNION ALL SELECT n + 1 FROM row WHERE n < ${count})
       INSERT INTO ${table} (${names.join(', ')})
       SELECT ${values.join(', ')} FROM row CROSS JOIN ${table} t WHERE t.id = ${likeId}`,
    );
  }

  close(): Promise<void> {
    return new Promise((resolve) => {
      this.#connection.close(resolve);
    });
  }
}

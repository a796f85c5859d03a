import { readdir } from 'node:fs/promises';
import { fileURLToPath } from 'node:url';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { readConfig } from '../config.ts';
import { closeContext, createContext } from '../context.ts';
import { migrations } from '../migrations/migrations.ts';
import { startTestShop } from '../testing/test-shop.ts';

let shop: Awaited<ReturnType<typeof startTestShop>>;

beforeAll(async () => {
  shop = await startTestShop();
});

afterAll(async () => {
  await shop.close();
});

const query = <Row>(sql: string) => shop.context.orm.em.getConnection().execute<Row[]>(sql);

describe('the schema', () => {
  it('is what the entities mean: every column, its type and whether it may be empty', async () => {
    for (const meta of Object.values(shop.context.orm.getMetadata().getAll())) {
      const columns = await query<{ name: string; type: string; notnull: number; pk: number }>(
        `PRAGMA table_info(${meta.tableName})`,
      );
      const there = columns.map(
        ({ name, type, notnull, pk }) =>
          `${name} ${type.toLowerCase()} ${notnull === 1 || pk > 0 ? 'set' : 'empty'}`,
      );
      const meant = meta.props.map(
        (prop) =>
          `${prop.fieldNames[0]} ${prop.columnTypes[0]} ${prop.nullable === true ? 'empty' : 'set'}`,
      );
      expect([meta.tableName, ...there.sort()]).toEqual([meta.tableName, ...meant.sort()]);
    }
  });

  it('knows of every column what it is when it is read', () => {
    for (const meta of Object.values(shop.context.orm.getMetadata().getAll())) {
      for (const { name, customType, runtimeType } of meta.props) {
        const own = customType === undefined ? runtimeType : customType.runtimeType;
        expect([meta.tableName, name, runtimeType]).toEqual([meta.tableName, name, own]);
      }
    }
  });

  it('has no table without an entity, and every table is STRICT', async () => {
    const tables = await query<{ name: string; strict: number }>(
      `SELECT name, strict FROM pragma_table_list WHERE schema = 'main' AND type = 'table' AND name NOT LIKE 'sqlite_%' AND name <> 'migration'`,
    );
    const named = Object.values(shop.context.orm.getMetadata().getAll()).map(
      (meta) => meta.tableName,
    );
    expect(tables.map((table) => table.name).sort()).toEqual(named.sort());
    expect(tables.filter((table) => table.strict !== 1)).toEqual([]);
  });

  it('names every migration of the folder', async () => {
    const folder = fileURLToPath(new URL('../migrations', import.meta.url));
    const files = (await readdir(folder))
      .filter((file) => file.startsWith('migration-'))
      .map((file) => file.replace('.ts', ''));
    expect(migrations.map((migration) => migration.name)).toEqual(files.sort());
  });

  it.each([
    'stock_movement',
    'payment',
    'impression',
    'posting',
    'activity',
    'bench_log',
    'pattern_version',
    'period',
    'time_reading',
    'finished_movement',
    'claim_credit',
  ])('lets nobody change or delete a row of %s', async (table) => {
    const triggers = await query<{ name: string }>(
      `SELECT name FROM sqlite_master WHERE type = 'trigger' AND tbl_name = '${table}'`,
    );
    expect(triggers.map((trigger) => trigger.name)).toEqual(
      expect.arrayContaining([`${table}_refuses_update`, `${table}_refuses_delete`]),
    );
  });

  it('refuses a change to the log of who did what', async () => {
    await expect(query(`UPDATE activity SET action = 'nothing' WHERE seq = 1`)).rejects.toThrow(
      'append-only',
    );
    await expect(query(`DELETE FROM activity WHERE seq = 1`)).rejects.toThrow('append-only');
  });

  it('opens every connection as it must', async () => {
    // A test shop does not wait for the disk; the program does.
    const { dataDir } = shop.context.config;
    const context = await createContext(readConfig({ DATA_DIR: dataDir, MODE: 'shop' }));
    const ask = (pragma: string) => context.orm.em.getConnection().execute(`PRAGMA ${pragma}`);
    expect(await ask('journal_mode')).toEqual([{ journal_mode: 'wal' }]);
    expect(await ask('synchronous')).toEqual([{ synchronous: 2 }]);
    expect(await ask('foreign_keys')).toEqual([{ foreign_keys: 1 }]);
    await closeContext(context);
  });
});

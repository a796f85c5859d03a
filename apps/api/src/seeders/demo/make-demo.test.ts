import { mkdtemp, readFile, rm } from 'node:fs/promises';
import os from 'node:os';
import path from 'node:path';
import { knex } from '@mikro-orm/sqlite';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { databaseFile, readConfig, type Config } from '../../config.ts';
import { demoFolder } from '../../testing/demo-folder.ts';
import { makeDemo } from './make-demo.ts';

let folder: string;
let first: Config;
let second: Config;

beforeAll(async () => {
  folder = await mkdtemp(path.join(os.tmpdir(), 'hidewright-year-'));
  first = await demoFolder();
  second = readConfig({
    DATA_DIR: folder,
    MODE: 'demo',
    DEMO_DAY: '2026-12-01',
    LOG_LEVEL: 'silent',
  });
  await makeDemo(second);
}, 300_000);

afterAll(async () => {
  await rm(folder, { recursive: true, force: true });
});

async function read<Row>(config: Config, sql: string): Promise<Row[]> {
  const connection = knex({
    client: 'sqlite3',
    connection: { filename: databaseFile(config.dataDir) },
    useNullAsDefault: true,
  });
  try {
    return (await connection.raw(sql)) as Row[];
  } finally {
    await connection.destroy();
  }
}

/** What differs each time by design: salted passwords, and links that nobody can guess. */
const secrets = new Set(['person', 'customer_link', 'outgoing_mail', 'web_session']);

describe('the demo’s year', () => {
  it('is the same for the same day, row by row', async () => {
    const tables = await read<{ name: string }>(
      first,
      `SELECT name FROM sqlite_master WHERE type = 'table' AND name NOT LIKE 'sqlite_%' AND name <> 'migration'`,
    );
    for (const { name } of tables.filter((table) => !secrets.has(table.name))) {
      const rows = `SELECT * FROM ${name} ORDER BY 1, 2`;
      expect(await read(second, rows), name).toEqual(await read(first, rows));
    }
  });

  it('has about two dozen runs, over twelve months that end on the day', async () => {
    const [year] = await read<{ runs: number; began: string; ended: string }>(
      first,
      `SELECT (SELECT COUNT(*) FROM customer_order) AS runs, (SELECT MIN(day) FROM stock_movement) AS began,
        (SELECT MAX(substr(at, 1, 10)) FROM activity) AS ended`,
    );
    expect(year?.runs).toBeGreaterThanOrEqual(24);
    expect(year?.began.slice(0, 7)).toBe('2025-11');
    expect(year?.ended).toBe('2026-12-01');
  });

  it('has every state of an order and a quote that a shop would see', async () => {
    const states = async (table: string) =>
      (await read<{ state: string }>(first, `SELECT DISTINCT state FROM ${table}`)).map(
        (row) => row.state,
      );
    expect(await states('quote')).toEqual(
      expect.arrayContaining(['draft', 'sent', 'agreed', 'declined', 'lapsed']),
    );
    expect(await states('customer_order')).toEqual(
      expect.arrayContaining([
        'awaiting proof',
        'cancelled',
        'taken on',
        'in work',
        'packed',
        'shipped',
        'closed',
      ]),
    );
    expect(await states('invoice')).toEqual(
      expect.arrayContaining(['issued', 'part paid', 'paid']),
    );
  });

  it('is never made over data that is there', async () => {
    const before = await readFile(databaseFile(second.dataDir));
    await makeDemo(second);
    expect((await readFile(databaseFile(second.dataDir))).equals(before)).toBe(true);
  });
});

import { pathToFileURL } from 'node:url';
import { knex, type Knex } from '@mikro-orm/sqlite';
import { readSalesSheet, type ReadRows } from '../modules/periods/sales-sheet.ts';
import { drawSalesSheet } from '../papers/sales-sheet.ts';

export interface SheetRequest {
  /** The database's file. */
  database: string;
  fromDay: string;
  toDay: string;
  workshopName: string;
  currency: string;
}

/** Reads a period on a read-only connection of its own, at one moment, and gives its spreadsheet's bytes. */
export async function salesSheet({ database, ...head }: SheetRequest): Promise<Uint8Array> {
  const connection = knex({
    client: 'sqlite3',
    // knex always asks to write; the mode in the file's address takes that away.
    connection: { filename: `${pathToFileURL(database).href}?mode=ro`, flags: ['OPEN_URI'] },
    useNullAsDefault: true,
  });
  try {
    const sheet = await connection.transaction((moment) => readSalesSheet(readerOn(moment), head));
    return await drawSalesSheet(sheet);
  } finally {
    await connection.destroy();
  }
}

const readerOn =
  (moment: Knex.Transaction): ReadRows =>
  async <Row>(sql: string, params: unknown[]) =>
    (await moment.raw(sql, params as string[])) as unknown as Row[];

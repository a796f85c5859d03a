import { pathToFileURL } from 'node:url';
import { knex } from '@mikro-orm/sqlite';
import { databaseFile } from '../config.ts';
import { bookRules } from './book-rules.ts';
import { buyingRules } from './buying-rules.ts';
import { fileRules } from './file-rules.ts';
import { itemRules } from './item-rules.ts';
import { orderRules } from './order-rules.ts';
import { quoteRules } from './quote-rules.ts';
import type { Query } from './rule.ts';
import { shelfRules } from './shelf-rules.ts';
import { stockRules } from './stock-rules.ts';
import { workRules } from './work-rules.ts';

interface Verified {
  says: string;
  faults: string[];
}

const rules = [
  ...fileRules,
  ...stockRules,
  ...buyingRules,
  ...quoteRules,
  ...orderRules,
  ...workRules,
  ...bookRules,
  ...itemRules,
  ...shelfRules,
];

/** Checks every rule on a read-only connection. */
export async function verifyFolder(dataDir: string): Promise<Verified[]> {
  const connection = knex({
    client: 'sqlite3',
    connection: {
      filename: `${pathToFileURL(databaseFile(dataDir)).href}?mode=ro`,
      flags: ['OPEN_URI'],
    },
    useNullAsDefault: true,
  });
  const query: Query = async <Row>(sql: string) => (await connection.raw(sql)) as Row[];
  try {
    const results: Verified[] = [];
    for (const { says, find } of rules)
      results.push({ says, faults: await find({ query, dataDir }) });
    return results;
  } finally {
    await connection.destroy();
  }
}

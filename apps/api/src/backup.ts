import { existsSync } from 'node:fs';
import { cp, mkdir } from 'node:fs/promises';
import path from 'node:path';
import { knex } from '@mikro-orm/sqlite';
import { databaseFile } from './config.ts';

/** `npm run backup -- DATA_DIR FOLDER`: a whole copy at one moment, also while the shop works. */
async function main(): Promise<number> {
  const [from, to] = process.argv.slice(2).map((folder) => path.resolve(folder));
  if (from === undefined || to === undefined || !existsSync(databaseFile(from))) {
    return refuse(
      'Name the data folder and a new folder for the backup, such as: npm run backup -- data-shop ../backup-monday',
    );
  }
  if (existsSync(to))
    return refuse(
      `${to} is there already. Name a folder that is not, so that no earlier backup is overwritten.`,
    );
  await mkdir(to, { recursive: true });
  const connection = knex({
    client: 'sqlite3',
    connection: { filename: databaseFile(from) },
    useNullAsDefault: true,
  });
  try {
    await connection.raw('VACUUM INTO ?', [databaseFile(to)]);
  } finally {
    await connection.destroy();
  }
  // The files never change and are only added to: copied after the database, none that it names is missing.
  for (const name of ['files', 'session-secret']) {
    if (existsSync(path.join(from, name)))
      await cp(path.join(from, name), path.join(to, name), { recursive: true });
  }
  process.stdout.write(`Backed up to ${to}. Keep it where only you can read it.\n`);
  return 0;
}

function refuse(sentence: string): number {
  process.stderr.write(`${sentence}\n`);
  return 2;
}

process.exitCode = await main();

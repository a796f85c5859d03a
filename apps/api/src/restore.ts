import { existsSync } from 'node:fs';
import { cp } from 'node:fs/promises';
import path from 'node:path';
import { databaseFile } from './config.ts';
import { verifyFolder } from './verify/verify-folder.ts';

/** `npm run restore -- FOLDER DATA_DIR`: puts a backup into a new data folder, once everything in it holds. */
async function main(): Promise<number> {
  const [from, to] = process.argv.slice(2).map((folder) => path.resolve(folder));
  if (from === undefined || to === undefined || !existsSync(databaseFile(from))) {
    return refuse(
      'Name the backup and a new data folder, such as: npm run restore -- ../backup-monday data-shop',
    );
  }
  if (existsSync(databaseFile(to))) {
    return refuse(`${to} holds a shop already. Move it away first, so that nothing in it is lost.`);
  }
  const broken = (await verifyFolder(from)).filter((rule) => rule.faults.length > 0);
  if (broken.length > 0)
    return refuse(`The backup does not hold: ${broken.map((rule) => rule.says).join('; ')}.`);
  await cp(from, to, { recursive: true });
  process.stdout.write(`Restored into ${to}.\n`);
  return 0;
}

function refuse(sentence: string): number {
  process.stderr.write(`${sentence}\n`);
  return 2;
}

process.exitCode = await main();

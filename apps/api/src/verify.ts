import { existsSync } from 'node:fs';
import path from 'node:path';
import { databaseFile } from './config.ts';
import { verifyFolder } from './verify/verify-folder.ts';

/** `npm run verify -- DATA_DIR`: reads a data folder, changes nothing, and says what does not hold. */
async function main(): Promise<number> {
  const given = process.argv[2];
  if (given === undefined || !existsSync(databaseFile(path.resolve(given)))) {
    process.stderr.write(
      'Name a data folder that holds hidewright.sqlite, such as: npm run verify -- data\n',
    );
    return 2;
  }
  const results = await verifyFolder(path.resolve(given));
  for (const { says, faults } of results) {
    process.stdout.write(`${faults.length === 0 ? 'holds ' : 'BROKEN'}  ${says}\n`);
    for (const fault of faults.slice(0, 20)) process.stdout.write(`        ${fault}\n`);
  }
  const broken = results.filter((result) => result.faults.length > 0).length;
  process.stdout.write(
    broken === 0 ? 'Everything holds.\n' : `${broken} of ${results.length} do not hold.\n`,
  );
  return broken === 0 ? 0 : 1;
}

process.exitCode = await main();

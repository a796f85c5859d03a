import { ensureInstalled } from './workspace/installed.mjs';
import { runTests } from './workspace/vitest.mjs';

await ensureInstalled();
const { passed, failed, skipped } = await runTests(['drills'], {
  args: process.argv.slice(2),
  env: { ...process.env, DRILL_SIZE: 'full' },
});
process.exitCode = failed === 0 ? 0 : 1;
console.log(`\n${passed} passed, ${failed} failed, ${skipped} skipped`);

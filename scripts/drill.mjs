import { ensureInstalled } from './workspace/installed.mjs';
import { runTests } from './workspace/vitest.mjs';

await ensureInstalled();
const env = { ...process.env, DRILL_SIZE: 'full' };
const asked = process.argv.slice(2);
const sum = { passed: 0, failed: 0, skipped: 0 };
// Whatever is done in the stockroom goes through the API's own flows, so it lives among its tests.
const groups = [
  [['drills'], asked],
  ...(asked.length === 0 ? [[['api'], ['stock-commands']]] : []),
];
for (const [projects, args] of groups) {
  const part = await runTests(projects, { args, env });
  for (const word of Object.keys(sum)) sum[word] += part[word];
}
process.exitCode = sum.failed === 0 ? 0 : 1;
console.log(`\n${sum.passed} passed, ${sum.failed} failed, ${sum.skipped} skipped`);

import { runChecks } from './workspace/check-steps.mjs';
import { chromiumAbsent, chromiumPath } from './workspace/chromium.mjs';
import { ensureInstalled } from './workspace/installed.mjs';
import { runTests } from './workspace/vitest.mjs';
import { buildWeb } from './workspace/web-build.mjs';

const stages = {
  check: () => runChecks(),
  web: webStage,
  unit: () => runTests(['domain', 'contract', 'api', 'web', 'stand-ins', 'lint', 'published']),
  whole: () => runTests(['commands', 'sheets', 'drills']),
  e2e: browserStage,
};

async function webStage() {
  const { code, output, seconds } = await buildWeb();
  if (output.trim() !== '') console.log(output.trimEnd());
  console.log(`${code === 0 ? 'ok  ' : 'FAIL'} build of the web pages (${seconds.toFixed(1)} s)`);
  return { passed: code === 0 ? 1 : 0, failed: code === 0 ? 0 : 1, skipped: 0 };
}

/** On a machine without a browser this is skipped, out loud; where it counts, it fails. */
async function browserStage() {
  if (chromiumPath()) return runTests(['e2e']);
  const mustRun = process.env.CI === 'true';
  console.log(`${mustRun ? 'FAIL' : 'SKIPPED'} browser tests. ${chromiumAbsent}`);
  return { passed: 0, failed: mustRun ? 1 : 0, skipped: mustRun ? 0 : 1 };
}

function chosenStages(args) {
  const unknown = args.filter((name) => !(name in stages));
  if (unknown.length > 0) {
    console.error(
      `There is no stage ${unknown.join(', ')}. Choose from: ${Object.keys(stages).join(', ')}.`,
    );
    process.exit(2);
  }
  return args.length > 0 ? args : Object.keys(stages);
}

const chosen = chosenStages(process.argv.slice(2));
await ensureInstalled();
const total = { passed: 0, failed: 0, skipped: 0 };
for (const name of chosen) {
  console.log(`\n── ${name} ${'─'.repeat(70 - name.length)}`);
  const sum = await stages[name]();
  for (const kind of Object.keys(total)) total[kind] += sum[kind];
}
process.exitCode = total.failed === 0 ? 0 : 1;
console.log(`\n${total.passed} passed, ${total.failed} failed, ${total.skipped} skipped`);

import { mkdtempSync, existsSync, readFileSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { ensureProgramsBuilt } from './programs-build.mjs';
import { inRoot } from './paths.mjs';
import { run } from './run.mjs';

const vitest = inRoot('node_modules', 'vitest', 'vitest.mjs');

/**
 * Runs the tests of some projects, showing them as they go; those that start the program find it built.
 * @returns {Promise<{passed: number, failed: number, skipped: number}>}
 */
export async function runTests(projects, { args = [], env = process.env } = {}) {
  await ensureProgramsBuilt();
  const folder = mkdtempSync(path.join(tmpdir(), 'hidewright-tests-'));
  const report = path.join(folder, 'report.json');
  const chosen = projects.flatMap((project) => ['--project', project]);
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${report}`];
  const { code } = await run(process.execPath, [vitest, 'run', ...chosen, ...reporters, ...args], {
    env,
    show: true,
  });
  const sum = existsSync(report)
    ? sumOf(JSON.parse(readFileSync(report, 'utf8')))
    : { passed: 0, failed: 0, skipped: 0 };
  rmSync(folder, { recursive: true });
  if (code !== 0 && sum.failed === 0) sum.failed = 1;
  return sum;
}

/** A file that could not even be loaded has no tests to count, and counts as one that failed. */
function sumOf({ testResults }) {
  const sum = { passed: 0, failed: 0, skipped: 0 };
  for (const file of testResults) {
    if (
      file.status === 'failed' &&
      !file.assertionResults.some(({ status }) => status === 'failed')
    ) {
      sum.failed += 1;
    }
    for (const { status } of file.assertionResults) {
      sum[status === 'passed' || status === 'failed' ? status : 'skipped'] += 1;
    }
  }
  return sum;
}

import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { inRoot } from './paths.mjs';
import { run } from './run.mjs';

const typed = [
  'packages/domain',
  'packages/contract',
  'apps/api',
  'apps/web',
  'apps/stand-ins',
  'tests',
];

/** The program that a package of the workspace's root brings. */
function program(name, bin = name) {
  const folder = inRoot('node_modules', name);
  const { bin: bins } = JSON.parse(readFileSync(path.join(folder, 'package.json'), 'utf8'));
  return path.join(folder, typeof bins === 'string' ? bins : bins[bin]);
}

/** What `npm run check` looks at: each step is one line of the sum. */
function steps() {
  const types = typed
    .filter((folder) => existsSync(inRoot(folder, 'tsconfig.json')))
    .map((folder) => ({
      name: `types of ${folder}`,
      args: [
        ...[program('typescript', 'tsc'), '-p', folder, '--pretty', 'false'],
        ...[
          '--incremental',
          '--tsBuildInfoFile',
          inRoot('.cache', 'types', `${folder}.tsbuildinfo`),
        ],
      ],
    }));
  return [
    {
      name: 'lint',
      args: [program('eslint'), '.', '--cache', '--cache-location', '.cache/eslint'],
    },
    ...types,
    {
      name: 'format',
      args: [
        ...[program('prettier'), '.', '--check', '--log-level', 'warn'],
        ...['--cache', '--cache-location', '.cache/prettier'],
      ],
    },
    { name: 'unused', args: [program('knip'), '--no-progress'] },
  ];
}

/**
 * Runs every step, two at a time, and says how each went as soon as it is known. A step that fails stops no other.
 * @returns {Promise<{passed: number, failed: number, skipped: number}>}
 */
export async function runChecks(only = []) {
  const isWanted = ({ name }) => only.length === 0 || only.includes(name.split(' ')[0]);
  const queue = steps().filter(isWanted);
  const sum = { passed: 0, failed: 0, skipped: 0 };
  const work = async () => {
    for (let step = queue.shift(); step; step = queue.shift()) {
      sum[(await runStep(step)) ? 'passed' : 'failed'] += 1;
    }
  };
  await Promise.all([work(), work()]);
  return sum;
}

async function runStep({ name, args }) {
  const began = performance.now();
  const { code, output } = await run(process.execPath, args);
  const seconds = (performance.now() - began) / 1000;
  console.log(`${code === 0 ? 'ok  ' : 'FAIL'} ${name} (${seconds.toFixed(1)} s)`);
  if (output.trim() !== '') console.log(output.trimEnd().replace(/^/gm, '     '));
  return code === 0;
}

import { spawn } from 'node:child_process';
import { existsSync, readdirSync } from 'node:fs';
import { createInterface } from 'node:readline';
import { ensureProgramsBuilt } from './workspace/programs-build.mjs';
import { ensureInstalled } from './workspace/installed.mjs';
import { inRoot } from './workspace/paths.mjs';

const folder = inRoot('tests', 'bench');
const known = () =>
  readdirSync(folder)
    .filter((file) => file.endsWith('.bench.ts'))
    .map((file) => file.replace('.bench.ts', ''));

/** Each bench is a program that prints one JSON line per figure; they are passed on as they come. */
function runBench(name, args, env) {
  return new Promise((resolve) => {
    const child = spawn(process.execPath, ['--import', 'tsx', `bench/${name}.bench.ts`, ...args], {
      cwd: inRoot('tests'),
      env,
      stdio: ['inherit', 'pipe', 'inherit'],
    });
    const figures = [];
    createInterface({ input: child.stdout }).on('line', (line) => {
      console.log(line);
      figures.push(...asFigure(line));
    });
    child.on('close', (code) => resolve({ code: code ?? 1, figures }));
  });
}

function asFigure(line) {
  try {
    const figure = JSON.parse(line);
    return 'bench' in figure && 'value' in figure ? [figure] : [];
  } catch {
    return [];
  }
}

function printTable(figures) {
  const rows = figures.map(({ bench, figure, value, unit, goal }) => [
    bench,
    figure,
    String(value),
    unit ?? '',
    goal === undefined || goal === null ? '' : String(goal),
  ]);
  const all = [['bench', 'figure', 'value', 'unit', 'goal'], ...rows];
  const widths = all[0].map((_, column) => Math.max(...all.map((row) => row[column].length)));
  for (const row of all) {
    console.error(
      row
        .map((cell, column) => cell.padEnd(widths[column]))
        .join('  ')
        .trimEnd(),
    );
  }
}

const [name, ...args] = process.argv.slice(2);
if (name !== undefined && !existsSync(`${folder}/${name}.bench.ts`)) {
  console.error(`There is no bench ${name}. Choose from: ${known().join(', ')}.`);
  process.exit(2);
}
const installSeconds = await ensureInstalled();
await ensureProgramsBuilt();
const figures = [];
for (const bench of name === undefined ? known() : [name]) {
  const env = { ...process.env, INSTALL_SECONDS: String(installSeconds) };
  const result = await runBench(bench, args, env);
  figures.push(...result.figures);
  if (result.code !== 0) process.exitCode = 1;
}
if (figures.length > 0) printTable(figures);

// `npm run -s compute -- NAME < in.json`: one number of the domain, checked without the web page.
import { readFileSync } from 'node:fs';
import { ensureInstalled } from './workspace/installed.mjs';

await ensureInstalled();
const { tsImport } = await import('tsx/esm/api');
const { compute, DomainError } = await tsImport('../packages/domain/src/index.ts', import.meta.url);

try {
  const answer = compute(process.argv[2] ?? '', readInput());
  process.stdout.write(`${JSON.stringify(answer)}\n`);
} catch (error) {
  if (!(error instanceof DomainError)) throw error;
  process.stderr.write(`${error.message}\n`);
  process.exitCode = 2;
}

function readInput() {
  const text = readFileSync(0, 'utf8');
  try {
    return JSON.parse(text);
  } catch {
    throw new DomainError('Give one JSON object on standard input.');
  }
}

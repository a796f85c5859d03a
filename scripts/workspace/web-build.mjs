import { existsSync } from 'node:fs';
import { filesBelow, fingerprint, stampIs, writeStamp } from './fingerprint.mjs';
import { inRoot } from './paths.mjs';
import { run, tail } from './run.mjs';

const web = inRoot('apps', 'web');
const stampFile = inRoot('apps', 'web', 'dist', '.sources');

function sources() {
  const folders = [web, inRoot('packages', 'domain'), inRoot('packages', 'contract')];
  return [
    inRoot('pnpm-lock.yaml'),
    inRoot('tsconfig.base.json'),
    ...folders.flatMap((folder) => filesBelow(folder, { withTests: false })),
  ];
}

/**
 * Builds the web pages when their sources have changed since the last time.
 * @returns {Promise<{code: number, output: string, seconds: number}>} `seconds` is 0 when there was nothing to do
 */
export async function buildWeb() {
  const wanted = fingerprint(sources());
  if (stampIs(stampFile, wanted)) return { code: 0, output: '', seconds: 0 };
  const began = performance.now();
  const vite = inRoot('apps', 'web', 'node_modules', 'vite', 'bin', 'vite.js');
  const { code, output } = await run(process.execPath, [vite, 'build', '--logLevel', 'warn'], {
    cwd: web,
    env: { ...process.env, NODE_ENV: 'production', NO_COLOR: '1' },
  });
  if (code === 0 && existsSync(inRoot('apps', 'web', 'dist'))) writeStamp(stampFile, wanted);
  return { code, output, seconds: (performance.now() - began) / 1000 };
}

/** Builds when needed, and ends this program with the reason when it cannot. */
export async function ensureWebBuilt() {
  const { code, output, seconds } = await buildWeb();
  if (code !== 0) {
    console.error(tail(output));
    console.error('The web pages could not be built; the lines above say why.');
    process.exit(1);
  }
  if (seconds > 0) console.error(`Built the web pages in ${seconds.toFixed(1)} s.`);
}

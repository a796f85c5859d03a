import { readFileSync } from 'node:fs';
import { filesBelow, fingerprint, stampIs, writeStamp } from './fingerprint.mjs';
import { inRoot } from './paths.mjs';

const api = inRoot('apps', 'api');
const stampFile = inRoot('apps', 'api', 'dist', '.sources');

function sources() {
  const folders = [
    inRoot('apps', 'api', 'src'),
    inRoot('packages', 'domain'),
    inRoot('packages', 'contract'),
  ];
  return [
    inRoot('pnpm-lock.yaml'),
    inRoot('apps', 'api', 'package.json'),
    inRoot('apps', 'api', 'tsconfig.json'),
    inRoot('tsconfig.base.json'),
    inRoot('scripts', 'workspace', 'api-build.mjs'),
    ...folders.flatMap((folder) => filesBelow(folder, { withTests: false })),
  ];
}

/** What comes from the registry stays where it is installed; what is of this workspace goes into the program. */
function installed() {
  const { dependencies } = JSON.parse(readFileSync(inRoot('apps', 'api', 'package.json'), 'utf8'));
  return Object.keys(dependencies).filter((name) => !dependencies[name].startsWith('workspace:'));
}

/**
 * Makes the API's programs from their sources when these have changed since the last time: plain JavaScript starts in
 * a third of the time and runs faster than TypeScript that is translated while it is read.
 */
export async function ensureApiBuilt() {
  const wanted = fingerprint(sources());
  if (stampIs(stampFile, wanted)) return;
  const { build } = await import('esbuild');
  const src = (...parts) => inRoot('apps', 'api', 'src', ...parts);
  await build({
    absWorkingDir: api,
    entryPoints: {
      server: src('server.ts'),
      verify: src('verify.ts'),
      backup: src('backup.ts'),
      restore: src('restore.ts'),
      entry: src('workers', 'work.ts'),
    },
    outdir: inRoot('apps', 'api', 'dist'),
    outExtension: { '.js': '.mjs' },
    bundle: true,
    splitting: true,
    format: 'esm',
    platform: 'node',
    target: 'node20',
    external: installed().flatMap((name) => [name, `${name}/*`]),
    sourcemap: true,
    logLevel: 'warning',
  });
  writeStamp(stampFile, wanted);
}

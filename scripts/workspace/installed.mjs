import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { fingerprint, manifests, stampIs, writeStamp } from './fingerprint.mjs';
import { inRoot } from './paths.mjs';
import { run, tail } from './run.mjs';

const stampFile = inRoot('node_modules', '.hidewright-installed');

/** Compiled parts fit one kind of Node on one kind of machine. */
const machine = `${process.platform}-${process.arch}-${process.versions.modules}`;

/**
 * Installs the workspace when its manifests or its lock have changed since the last time.
 * Says what it does on standard error. Returns the seconds it took, 0 when there was nothing to do.
 */
export async function ensureInstalled() {
  refuseOldNode();
  const wanted = fingerprint(manifests(), machine);
  if (stampIs(stampFile, wanted)) return 0;

  console.error('Installing the workspace (the first time takes about a minute) …');
  const began = performance.now();
  const { packageManager } = JSON.parse(readFileSync(inRoot('package.json'), 'utf8'));
  const { code, output } = await run(
    'npx',
    ['-y', packageManager, 'install', '--frozen-lockfile'],
    {
      env: compilingEnvironment(),
    },
  );
  if (code !== 0) {
    console.error(tail(output));
    console.error(
      'The workspace could not be installed; the lines above say why. SQLite is compiled here, ' +
        'which needs Python 3, make and a C++ compiler (on Debian: apt-get install build-essential python3).',
    );
    process.exit(1);
  }
  writeStamp(stampFile, wanted);
  const seconds = (performance.now() - began) / 1000;
  console.error(`Installed in ${seconds.toFixed(1)} s.`);
  return seconds;
}

/** SQLite's build script would otherwise ask hosts for headers and for a ready-made library. */
function compilingEnvironment() {
  const prefix = path.resolve(process.execPath, '..', '..');
  const env = {
    CFLAGS: '-O2 -w',
    CXXFLAGS: '-O2 -w',
    ...process.env,
    npm_config_build_from_source: 'true',
    CI: 'true',
  };
  if (existsSync(path.join(prefix, 'include', 'node'))) env.npm_config_nodedir = prefix;
  return env;
}

function refuseOldNode() {
  const [major = 0, minor = 0] = process.versions.node.split('.').map(Number);
  if (major > 20 || (major === 20 && minor >= 19)) return;
  console.error(`Hidewright needs Node 20.19 or later; this is ${process.versions.node}.`);
  process.exit(1);
}

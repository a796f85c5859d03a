import path from 'node:path';
import { ensureProgramsBuilt } from './programs-build.mjs';
import { ensureInstalled } from './installed.mjs';
import { inRoot } from './paths.mjs';
import { become } from './run.mjs';

/** Settings that name a file or a folder; a relative one is meant from where the person stands. */
const pathSettings = ['DATA_DIR', 'TLS_CERT', 'TLS_KEY', 'CHECKS_DIR'];

export function withAbsolutePaths(env = process.env) {
  const absolute = { ...env };
  for (const name of pathSettings) {
    if (absolute[name]) absolute[name] = path.resolve(absolute[name]);
  }
  return absolute;
}

export const apiFolder = inRoot('apps', 'api');

/** How Node starts one of the API's programs as built: `ensureProgramsBuilt` comes first. */
export function apiProgram(name) {
  return ['--enable-source-maps', path.join('dist', `${name}.mjs`)];
}

/** Installs and builds when needed, then becomes one of the API's programs, with a data folder as its argument. */
export async function launchApiProgram(name, args) {
  await ensureInstalled();
  await ensureProgramsBuilt();
  become(process.execPath, [...apiProgram(name), ...args], {
    cwd: apiFolder,
    env: withAbsolutePaths(),
  });
}

/** Arguments that are not options are files or folders, seen from where the person stands. */
export function pathArguments(args = process.argv.slice(2)) {
  return args.map((arg) => (arg.startsWith('-') ? arg : path.resolve(arg)));
}

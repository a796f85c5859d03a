import { createHash } from 'node:crypto';
import { existsSync, readFileSync, readdirSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { inRoot, root } from './paths.mjs';

const passedOver = new Set(['node_modules', 'dist', 'coverage', '.cache']);

/** Every file below a folder of the workspace, in a fixed order; tests are passed over on request. */
export function filesBelow(folder, { withTests = true } = {}) {
  const entries = readdirSync(folder, { withFileTypes: true });
  entries.sort((a, b) => (a.name < b.name ? -1 : 1));
  return entries.flatMap((entry) => {
    const file = path.join(folder, entry.name);
    if (entry.isDirectory()) {
      return passedOver.has(entry.name) ? [] : filesBelow(file, { withTests });
    }
    return withTests || !/\.test\.tsx?$/.test(entry.name) ? [file] : [];
  });
}

/** One hash over names and contents, so that a moved file counts as a change. */
export function fingerprint(files, ...more) {
  const hash = createHash('sha256');
  for (const file of files) {
    hash.update(`${path.relative(root, file)}\0`);
    hash.update(readFileSync(file));
    hash.update('\0');
  }
  for (const text of more) hash.update(`${text}\0`);
  return hash.digest('hex');
}

export function stampIs(stampFile, value) {
  return existsSync(stampFile) && readFileSync(stampFile, 'utf8') === value;
}

export function writeStamp(stampFile, value) {
  writeFileSync(stampFile, value);
}

/** The manifests of all packages, and what pnpm decides by. */
export function manifests() {
  const packages = ['apps', 'packages'].flatMap((group) =>
    readdirSync(inRoot(group)).map((name) => inRoot(group, name, 'package.json')),
  );
  return [
    inRoot('package.json'),
    inRoot('pnpm-workspace.yaml'),
    inRoot('pnpm-lock.yaml'),
    inRoot('tests', 'package.json'),
    ...packages.filter((file) => existsSync(file)).sort(),
  ];
}

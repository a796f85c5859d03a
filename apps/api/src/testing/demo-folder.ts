import { mkdtemp } from 'node:fs/promises';
import { rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { readConfig, type Config } from '../config.ts';
import { makeDemo } from '../seeders/demo/make-demo.ts';

let made: Promise<Config> | undefined;

/** The demo workshop, made once for all the tests of a process; tests read it, and change copies. */
export function demoFolder(): Promise<Config> {
  made ??= make();
  return made;
}

async function make(): Promise<Config> {
  const folder = await mkdtemp(path.join(os.tmpdir(), 'hidewright-demo-'));
  process.once('exit', () => {
    rmSync(folder, { recursive: true, force: true });
  });
  const config = readConfig({
    DATA_DIR: path.join(folder, 'demo'),
    MODE: 'demo',
    DEMO_DAY: '2026-12-01',
    LOG_LEVEL: 'silent',
  });
  await makeDemo(config);
  return config;
}

import { rm } from 'node:fs/promises';
import { startHidewright, temporaryFolder } from '../support/hidewright.ts';
import { report } from './figure.ts';

/** Seconds from the command to a healthy server: with an empty data folder, then with its data there. */
const dataDir = await temporaryFolder();

async function secondsToHealthy() {
  const began = performance.now();
  const hidewright = await startHidewright({ dataDir });
  const seconds = (performance.now() - began) / 1000;
  const said = hidewright.said();
  await hidewright.stop();
  return { seconds, building: Number(/Built the web pages in ([\d.]+) s/.exec(said)?.[1] ?? 0) };
}

const installing = Number(process.env['INSTALL_SECONDS'] ?? 0);
const first = await secondsToHealthy();
const second = await secondsToHealthy();
await rm(dataDir, { recursive: true });

const figure = (name: string, value: number, goal: number | null, unit = 's') =>
  report({ bench: 'start', figure: name, value, unit, goal });
if (installing > 0) figure('install', installing, null);
if (first.building > 0) figure('web build, within the first start', first.building, null);
figure('first start', first.seconds, 60);
figure('second start', second.seconds, 5);
figure('second ÷ first', second.seconds / first.seconds, null, 'ratio');

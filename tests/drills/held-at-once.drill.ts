import { execFile } from 'node:child_process';
import { rm } from 'node:fs/promises';
import path from 'node:path';
import { promisify } from 'node:util';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { temporaryFolder } from '../support/hidewright.ts';
import { startServer } from './server-under-drill.ts';
import { openRackedShop, type RackedShop } from './racked-shop.ts';

const rounds = process.env['DRILL_SIZE'] === 'full' ? 200 : 20;
const people = 50;
const lots = 10;

let folder: string;
beforeAll(async () => {
  folder = await temporaryFolder();
});
afterAll(async () => {
  await rm(folder, { recursive: true, force: true });
});

interface Round {
  held: number;
  /** What those were told who came too late. */
  refusals: { status: number; detail: string }[];
}

/** Everybody at once holds one of the last lots for a job of their own. */
async function oneRound(shop: RackedShop): Promise<Round> {
  const racked = await shop.receiveLots(lots);
  const answers = await Promise.all(
    shop.jobIds.map((jobId, at) => {
      const { id: lotId, measuredAreaMm2: areaMm2 } = racked[at % lots] as (typeof racked)[number];
      return shop.send(at, `/jobs/${jobId}/reservations`, { lotId, areaMm2 });
    }),
  );
  return {
    held: answers.filter(({ status }) => status === 201).length,
    refusals: answers.flatMap(({ status, body }) =>
      status === 201 ? [] : [{ status, detail: String(body['detail']) }],
    ),
  };
}

async function drill(
  dataDir: string,
  size: { times: number; people: number },
  planted?: string,
): Promise<Round[]> {
  const server = await startServer(dataDir, planted);
  try {
    const shop = await openRackedShop(server.url, size.people);
    const played: Round[] = [];
    for (let round = 0; round < size.times; round += 1) played.push(await oneRound(shop));
    return played;
  } finally {
    await server.kill();
  }
}

const verify = promisify(execFile);
const root = path.resolve(import.meta.dirname, '..', '..');

describe('fifty people who hold the last ten lots at once', () => {
  it('[I2] get ten of them, and the others hear what is free', { timeout: 3_600_000 }, async () => {
    const played = await drill(`${folder}/sound`, { times: rounds, people });
    expect(played.map(({ held }) => held)).toEqual(played.map(() => lots));
    const saidWhatIsFree = ({ status, detail }: Round['refusals'][number]) =>
      status === 409 && detail.startsWith('There is 0 ft² of lot');
    const others = played.flatMap(({ refusals }) =>
      refusals.filter((each) => !saidWhatIsFree(each)),
    );
    expect(others).toEqual([]);
    const args = [path.join(root, 'scripts', 'verify.mjs'), `${folder}/sound`];
    const { stdout } = await verify(process.execPath, args, { cwd: root });
    expect(stdout).toContain('holds');
  });

  it('would be found out if what is free were looked up before it is held', async () => {
    const played = await drill(
      `${folder}/planted`,
      { times: 2, people: 2 * lots },
      'check-then-reserve.mjs',
    );
    expect(played.some(({ held }) => held > lots)).toBe(true);
  });
});

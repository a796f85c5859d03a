import { rm } from 'node:fs/promises';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { temporaryFolder } from '../support/hidewright.ts';
import { startServer } from './server-under-drill.ts';

const rounds = process.env['DRILL_SIZE'] === 'full' ? 20 : 2;
const writers = 4;

let folder: string;
beforeAll(async () => {
  folder = await temporaryFolder();
});
afterAll(async () => {
  await rm(folder, { recursive: true, force: true });
});

const owner = {
  workshopName: 'A drilled shop',
  ownerName: 'The owner',
  email: 'owner@example.com',
  password: 'a-long-password-for-drills',
};

async function cookieFrom(url: string, path: string, body: object): Promise<string> {
  const reply = await fetch(`${url}/api${path}`, {
    method: 'POST',
    headers: { 'Content-Type': 'application/json' },
    body: JSON.stringify(body),
  });
  expect(reply.ok, `${path} answered ${reply.status}`).toBe(true);
  return reply.headers.get('set-cookie')?.split(';')[0] ?? '';
}

/** Adds leathers from several sides until the server dies, and keeps the names it acknowledged. */
async function writeUntilDeath(
  url: string,
  cookie: string,
  prefix: string,
  acknowledged: string[],
): Promise<void> {
  const write = async (writer: number) => {
    for (let at = 0; ; at += 1) {
      const name = `${prefix}-${writer}-${at}`;
      const headers = {
        'Content-Type': 'application/json',
        Cookie: cookie,
        'Idempotency-Key': name,
      };
      const body = JSON.stringify({ name, pricePerFt2: '9.50' });
      try {
        const reply = await fetch(`${url}/api/leathers`, { method: 'POST', headers, body });
        if (reply.status === 201) acknowledged.push(name);
      } catch {
        return;
      }
    }
  };
  await Promise.all(Array.from({ length: writers }, (_, writer) => write(writer)));
}

async function keptNames(url: string, cookie: string): Promise<string[]> {
  const names: string[] = [];
  for (let cursor: string | null = ''; cursor !== null;) {
    const reply: Response = await fetch(
      `${url}/api/leathers?limit=200${cursor && `&cursor=${cursor}`}`,
      { headers: { Cookie: cookie } },
    );
    const page = (await reply.json()) as { items: { name: string }[]; next: string | null };
    names.push(...page.items.map((item) => item.name));
    cursor = page.next;
  }
  return names;
}

/** Kills the server in the middle of its work, again and again; gives what it acknowledged and what it then had. */
async function drill(
  dataDir: string,
  times: number,
  planted?: string,
): Promise<{ acknowledged: string[]; kept: string[] }> {
  const acknowledged: string[] = [];
  for (let round = 0; round < times; round += 1) {
    const server = await startServer(dataDir, planted);
    const cookie = await (round === 0
      ? cookieFrom(server.url, '/first-run', owner)
      : cookieFrom(server.url, '/session', { email: owner.email, password: owner.password }));
    // The owner of a new shop must be there before the cut, or the next round has nobody to sign in.
    await new Promise((resolve) => setTimeout(resolve, 1000));
    const before = acknowledged.length;
    const dead = writeUntilDeath(server.url, cookie, `round-${round}`, acknowledged);
    await expect
      .poll(() => acknowledged.length - before, { timeout: 60_000, interval: 5 })
      .toBeGreaterThan(5 + 3 * round);
    await server.kill();
    await dead;
  }
  const server = await startServer(dataDir);
  const kept = await keptNames(
    server.url,
    await cookieFrom(server.url, '/session', { email: owner.email, password: owner.password }),
  );
  await server.kill();
  return { acknowledged, kept };
}

describe('what was acknowledged', () => {
  it('is there after the power went, once', async () => {
    const { acknowledged, kept } = await drill(`${folder}/sound`, rounds);
    expect(acknowledged.filter((name) => !kept.includes(name))).toEqual([]);
    expect(new Set(kept).size).toBe(kept.length);
  });

  it('would be missed if the program answered before it committed', async () => {
    const { acknowledged, kept } = await drill(`${folder}/planted`, 1, 'reply-before-commit.mjs');
    expect(acknowledged.filter((name) => !kept.includes(name))).not.toEqual([]);
  });
});

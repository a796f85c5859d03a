import { rm } from 'node:fs/promises';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { startHidewright, temporaryFolder } from '../support/hidewright.ts';

interface Session {
  mode: string;
  firstRun: boolean;
}

async function session(url: string): Promise<Session> {
  return (await (await fetch(`${url}/api/session`)).json()) as Session;
}

describe.each(['demo', 'shop'] as const)('a %s', (mode) => {
  let dataDir: string;
  beforeAll(async () => {
    dataDir = await temporaryFolder();
  });
  afterAll(() => rm(dataDir, { recursive: true }));

  test('serves pages and API from one address, and ends in order, twice on the same data', async () => {
    for (const time of ['first', 'second']) {
      const hidewright = await startHidewright({ dataDir, mode });
      const page = await fetch(hidewright.url);
      expect(page.headers.get('content-type')).toContain('text/html');
      expect(await session(hidewright.url)).toMatchObject({ mode, firstRun: mode === 'shop' });
      expect(hidewright.mailboxUrl === '').toBe(mode === 'shop');
      expect(hidewright.said().includes('marlpit-by-the-fen')).toBe(mode === 'demo');
      const making = hidewright.said().includes('Making the demo workshop');
      expect(making).toBe(mode === 'demo' && time === 'first');
      expect(await hidewright.stop()).toBe(0);
    }
  });
});

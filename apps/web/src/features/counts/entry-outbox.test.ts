import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { ApiProblem } from '../../lib/api-problem.ts';
import { entryOutbox, putEntry } from './entry-outbox.ts';

const line = { id: 7 };
const asked: { address: string; body: unknown }[] = [];
let answer: () => Response | Promise<Response>;

beforeEach(() => {
  asked.length = 0;
  vi.stubGlobal('fetch', async (address: string, init: RequestInit) => {
    asked.push({ address, body: JSON.parse(String(init.body)) });
    return answer();
  });
});
afterEach(() => vi.unstubAllGlobals());

const refuse = (status: number) =>
  new Response(JSON.stringify({ type: 'about:blank', title: 'No', status, detail: 'Not now.' }), {
    status,
  });

async function send() {
  const refused: ApiProblem[] = [];
  await entryOutbox.send('maker@example.com', {
    onSent: () => undefined,
    onRefused: (_, problem) => refused.push(problem),
  });
  return refused;
}

describe('what was counted on a phone', () => {
  it('waits until it can be sent, and only the last figure of a line', async () => {
    const entry = { person: 'maker@example.com', countId: 3, lineId: line.id };
    putEntry({ ...entry, entry: { quantity: 12 } });
    putEntry({ ...entry, entry: { quantity: 14 } });
    putEntry({ ...entry, person: 'owner@example.com', entry: { quantity: 9 } });
    answer = () => Promise.reject(new TypeError('no network'));
    await send();
    expect(entryOutbox.waiting()).toHaveLength(2);
    answer = () => refuse(503);
    await send();
    expect(entryOutbox.waiting()).toHaveLength(2);
    expect(asked.map(({ body }) => body)).toMatchObject([{ quantity: 14 }, { quantity: 14 }]);
    expect(asked[0]?.address).toBe('/api/counts/3/lines/7');

    answer = () => refuse(409);
    expect(await send()).toMatchObject([{ status: 409 }]);
    expect(entryOutbox.waiting()).toMatchObject([{ person: 'owner@example.com' }]);
  });
});

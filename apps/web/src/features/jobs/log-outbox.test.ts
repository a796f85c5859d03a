import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { ApiProblem } from '../../lib/api-problem.ts';

type Outbox = Awaited<ReturnType<typeof open>>;

const stored = new Map<string, string>();
let keys: string[];
let answer: (key: string) => Promise<Response>;
let outbox: Outbox;

const refusal = (status: number, detail: string) =>
  new Response(JSON.stringify({ type: 'about:blank', title: 'No', status, detail }), { status });

/** As after the page was opened anew: what is stored stays. */
async function open() {
  vi.resetModules();
  return import('./log-outbox.ts');
}

beforeEach(async () => {
  stored.clear();
  keys = [];
  vi.stubGlobal('localStorage', {
    getItem: (name: string) => stored.get(name) ?? null,
    setItem: (name: string, value: string) => stored.set(name, value),
  });
  vi.stubGlobal('fetch', (_address: string, { headers }: { headers: Record<string, string> }) => {
    const key = headers['idempotency-key'] ?? '';
    keys.push(key);
    return answer(key);
  });
  answer = () => Promise.reject(new TypeError('no network'));
  outbox = await open();
});
afterEach(() => vi.unstubAllGlobals());

const put = (good: number, person = 'maker@example.com') =>
  outbox.putLog({ person, jobId: 1, body: { stepId: 2, good } });

async function send(): Promise<ApiProblem[]> {
  const refused: ApiProblem[] = [];
  await outbox.logOutbox.send('maker@example.com', {
    onSent: () => undefined,
    onRefused: (_log, problem) => refused.push(problem),
  });
  return refused;
}

describe('what is logged at the bench', () => {
  it('stays on the device while nothing can be reached, also when the page is opened anew', async () => {
    put(13);
    await send();
    expect(outbox.logOutbox.waiting()).toHaveLength(1);
    outbox = await open();
    expect(outbox.logOutbox.waiting()).toMatchObject([{ body: { good: 13 } }]);
  });

  it('is sent again under the same key, so that it counts once', async () => {
    put(13);
    await send();
    outbox = await open();
    await send();
    expect(new Set(keys).size).toBe(1);
    expect(keys).toHaveLength(2);
  });

  it('is dropped once it is refused, and the refusal is told', async () => {
    put(900);
    put(5);
    answer = () => Promise.resolve(refusal(422, 'Log at most 3.'));
    const refused = await send();
    expect(refused.map(({ detail }) => detail)).toEqual(['Log at most 3.', 'Log at most 3.']);
    expect(outbox.logOutbox.waiting()).toEqual([]);
  });

  it.each([401, 429, 503])('waits through a %i', async (status) => {
    put(13);
    answer = () => Promise.resolve(refusal(status, 'Not now.'));
    expect(await send()).toEqual([]);
    expect(outbox.logOutbox.waiting()).toHaveLength(1);
  });

  it('is not sent in the name of somebody else', async () => {
    put(13, 'owner@example.com');
    await send();
    expect(keys).toEqual([]);
    expect(outbox.logOutbox.waiting()).toHaveLength(1);
  });
});

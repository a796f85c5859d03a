import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { ApiProblem } from '../../lib/api-problem.ts';
import { requireAllArrived } from './all-arrived.ts';
import {
  entryOutbox,
  forgetRefused,
  keepRefused,
  ofSheet,
  putEntry,
  refusedEntries,
  takeBackEntry,
} from './entry-outbox.ts';

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

  it('is not sent where what stands there now is no figure', async () => {
    const entry = { person: 'maker@example.com', countId: 3, lineId: 8 };
    putEntry({ ...entry, entry: { quantity: 12 } });
    takeBackEntry(entry);
    await send();
    expect(asked).toEqual([]);
  });

  it('is kept as refused for its own sheet, until something else is typed or it was seen', () => {
    const refused = { person: 'maker@example.com', countId: 3, lineId: 9, entry: { quantity: 4 } };
    keepRefused({ ...refused, typedAt: 1 }, 'The sheet was handed in.');
    const other = { person: 'maker@example.com', countId: 4 };
    expect(ofSheet(refusedEntries.all(), other)).toEqual([]);
    expect(ofSheet(refusedEntries.all(), refused)).toMatchObject([
      { entry: { quantity: 4 }, why: 'The sheet was handed in.' },
    ]);
    putEntry(refused);
    expect(refusedEntries.all()).toEqual([]);
    takeBackEntry(refused);
    keepRefused({ ...refused, typedAt: 1 }, 'The sheet was handed in.');
    forgetRefused(other);
    expect(refusedEntries.all()).toHaveLength(1);
    forgetRefused(refused);
    expect(refusedEntries.all()).toEqual([]);
  });
});

describe('handing in what was counted on a phone', () => {
  const sheet = { person: 'maker@example.com', countId: 5 };
  const entry = { ...sheet, lineId: 11, entry: { quantity: 4 } };
  const doing = () =>
    requireAllArrived(sheet, () =>
      entryOutbox.send(sheet.person, {
        onSent: () => undefined,
        onRefused: (refused, { detail }) => keepRefused(refused, detail),
      }),
    );

  it('waits until the last figure has arrived', async () => {
    putEntry(entry);
    answer = () => refuse(503);
    await expect(doing()).rejects.toThrow('1 figure still waits on this device');
    takeBackEntry(entry);
    await expect(doing()).resolves.toBeUndefined();
  });

  it('waits for what is being sent already', async () => {
    putEntry(entry);
    let fail = (_: Response): void => undefined;
    answer = () => new Promise((resolve) => (fail = resolve));
    const underWay = send();
    await vi.waitFor(() => expect(asked).toHaveLength(1));
    const handingIn = doing();
    fail(refuse(503));
    await expect(handingIn).rejects.toThrow('1 figure still waits on this device');
    await underWay;
    expect(asked).toHaveLength(1);
    takeBackEntry(entry);
  });

  it('is stopped by a figure that is refused on the way', async () => {
    putEntry(entry);
    answer = () => refuse(422);
    await expect(doing()).rejects.toThrow('A figure was refused');
    expect(entryOutbox.waiting().filter(({ countId }) => countId === 5)).toEqual([]);
    forgetRefused(sheet);
  });
});

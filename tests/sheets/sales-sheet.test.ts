import { execFileSync, spawnSync } from 'node:child_process';
import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterAll, beforeAll, expect, test } from 'vitest';
import { startHidewright, type Hidewright } from '../support/hidewright.ts';

interface Totals {
  invoices: number;
  net: string;
  tax: string;
  total: string;
  payments: number;
  received: string;
}

interface Answer {
  sheets: string[];
  faults: string[];
  recomputed: Totals;
  written: Pick<Totals, 'net' | 'tax' | 'total' | 'received'>;
}

/** Debian's own first: another Python on the path has packages of its own. */
const python = ['/usr/bin/python3', 'python3'].find(
  (each) => spawnSync(each, ['-c', 'import openpyxl']).status === 0,
);
const absent =
  'SKIPPED reading the sales sheet with openpyxl, which is not installed. On Debian: apt-get install python3-openpyxl.';

let hidewright: Hidewright;
let folder: string;
let cookie = '';

beforeAll(async () => {
  if (python === undefined) return;
  folder = await mkdtemp(path.join(tmpdir(), 'hidewright-sheet-'));
  hidewright = await startHidewright();
  const reply = await fetch(`${hidewright.url}/api/session`, {
    method: 'POST',
    headers: { 'content-type': 'application/json' },
    body: JSON.stringify({ email: 'bookkeeper@example.com', password: 'marlpit-by-the-fen' }),
  });
  cookie = reply.headers.getSetCookie().join('; ');
});
afterAll(async () => {
  if (python === undefined) return;
  await hidewright.stop();
  await rm(folder, { recursive: true });
});

const get = (address: string) => fetch(`${hidewright.url}/api${address}`, { headers: { cookie } });

function readWithPython(file: string): Answer {
  const script = path.join(import.meta.dirname, 'read_totals.py');
  const said = execFileSync(String(python), [script, file], { encoding: 'utf8' });
  return JSON.parse(said) as Answer;
}

/** The demo's last month, and its whole year. */
async function periods(): Promise<[from: string, to: string][]> {
  const session = (await (await get('/session')).json()) as { workshop: { today: string } };
  const { today } = session.workshop;
  const yearBefore = new Date(Date.parse(today) - 365 * 86_400_000).toISOString().slice(0, 10);
  return [
    [`${today.slice(0, 7)}-01`, today],
    [yearBefore, today],
  ];
}

test('openpyxl reads the sales sheet, and its rows sum to what the API says, to the cent', async ({
  skip,
}) => {
  if (python === undefined) {
    expect(process.env['CI'], absent).not.toBe('true');
    process.stderr.write(`${absent}\n`);
    skip(absent);
  }
  for (const [from, to] of await periods()) {
    const query = `?from=${from}&to=${to}`;
    const { totals } = (await (await get(`/sales-sheets${query}`)).json()) as { totals: Totals };
    const file = path.join(folder, `${from}.xlsx`);
    await writeFile(
      file,
      Buffer.from(await (await get(`/sales-sheets/file${query}`)).arrayBuffer()),
    );
    const answer = readWithPython(file);
    expect(answer.sheets).toEqual(['Invoices', 'Lines', 'Tax by rate', 'Payments', 'Totals']);
    expect(answer.faults).toEqual([]);
    expect(answer.recomputed).toEqual(totals);
    const { net, tax, total, received } = totals;
    expect(answer.written).toEqual({ net, tax, total, received });
    if (to.slice(0, 7) !== from.slice(0, 7)) expect(totals.invoices).toBeGreaterThan(10);
  }
});

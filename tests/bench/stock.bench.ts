import { readFile, rm } from 'node:fs/promises';
import path from 'node:path';
import { startServer } from '../drills/server-under-drill.ts';
import { temporaryFolder } from '../support/hidewright.ts';
import { callerOf, type Caller } from './caller.ts';
import { report } from './figure.ts';
import { fill, furnish } from './full-stockroom.ts';
import { RawDatabase } from './raw-database.ts';

/**
 * A stockroom of 5,000 items, 20,000 lots and 500,000 movements: how long the API takes beside the same SQL run raw,
 * and whether it asks the database as often as in an empty one.
 */
const dataDir = await temporaryFolder();
const recordedSql = path.join(dataDir, 'statements.jsonl');
process.env['RECORDED_SQL'] = recordedSql;
const signIn = { email: 'owner@example.com', password: 'a-long-password-for-benches' };

interface Statement {
  sql: string;
  params: unknown[];
}

/** What a request asks of the database. */
async function recorded(call: Caller, ask: (call: Caller) => Promise<unknown>) {
  const read = async () =>
    (await readFile(recordedSql, 'utf8').catch(() => '')).split('\n').filter((line) => line !== '');
  await ask(call);
  const before = (await read()).length;
  await ask(call);
  return (await read()).slice(before).map((line) => JSON.parse(line) as Statement);
}

const empty = await startServer(dataDir, path.join('..', '..', 'bench', 'recorded-sql.mjs'));
const emptyCall = callerOf(empty.url);
const patternIds = await furnish(emptyCall);
const by = new Date(Date.now() + 30 * 86_400_000).toISOString().slice(0, 10);
const runs = patternIds.map((patternId) => ({ patternId, quantity: 200, by }));
const questions: Record<string, (call: Caller) => Promise<unknown>> = {
  'first page of hardware': (call) => call('GET', '/hardware?limit=50'),
  'first page of lots': (call) => call('GET', '/lots?limit=50'),
  'on hand of all': (call) => call('GET', '/stock-levels'),
  'check of five patterns': (call) => call('POST', '/checks', { runs }),
};
const fewStatements = new Map<string, number>();
for (const [name, ask] of Object.entries(questions))
  fewStatements.set(name, (await recorded(emptyCall, ask)).length);
await empty.kill();

const database = new RawDatabase(dataDir);
await fill(database);
const watched = await startServer(dataDir, path.join('..', '..', 'bench', 'recorded-sql.mjs'));
const watchedCall = callerOf(watched.url);
await watchedCall('POST', '/session', signIn);
const statements = new Map<string, Statement[]>();
for (const [name, ask] of Object.entries(questions))
  statements.set(name, await recorded(watchedCall, ask));
await watched.kill();

const middle = (times: number[]) => times.sort((a, b) => a - b)[times.length >> 1] ?? 0;

/** The middle of up to 200 turns after the first third, which warms up; a slow one takes 5 s at most. */
async function timed(run: () => Promise<unknown>): Promise<number> {
  const times: number[] = [];
  const end = performance.now() + 5000;
  while (times.length < 9 || (times.length < 200 && performance.now() < end)) {
    const began = performance.now();
    await run();
    times.push(performance.now() - began);
  }
  return middle(times.slice(Math.floor(times.length / 3)));
}

const server = await startServer(dataDir);
const call = callerOf(server.url);
await call('POST', '/session', signIn);
for (const [name, ask] of Object.entries(questions)) {
  const asked = statements.get(name) ?? [];
  const raw = await timed(async () => {
    for (const { sql, params } of asked) await database.all(sql, params);
  });
  const api = await timed(() => ask(call));
  const figure = (what: string, value: number, unit: string, goal: number | null) =>
    report({ bench: 'stock', figure: `${name}: ${what}`, value, unit, goal });
  figure('API', api, 'ms', null);
  figure('the same SQL raw', raw, 'ms', null);
  figure('API ÷ raw', api / raw, 'ratio', 5);
  figure('statements', asked.length, 'count', fewStatements.get(name) ?? 0);
}
await server.kill();
await database.close();
await rm(dataDir, { recursive: true });

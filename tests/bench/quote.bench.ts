import { rm } from 'node:fs/promises';
import { priceRun, type RunHardware, type RunInput } from '@hidewright/domain';
import { startHidewright, temporaryFolder } from '../support/hidewright.ts';
import { report } from './figure.ts';
import { calibrationMs } from './timing.ts';

/**
 * A quote of five quantities with two options, its layout stored: CPU time in the domain, and how long the API takes
 * for it, each beside a fixed loop of arithmetic on the same machine.
 */
const dataDir = await temporaryFolder();
const hidewright = await startHidewright({ dataDir });
const calibration = calibrationMs();

const password = 'marlpit-by-the-fen';
let cookie = '';

interface Pattern {
  id: number;
  name: string;
  version: number;
  definition: { options?: { name: string }[] };
}

interface RunBasis {
  input: RunInput;
  options: { name: string; hardware: RunHardware[] }[];
}

async function call<Reply>(
  method: string,
  path: string,
  body?: unknown,
  version?: number,
): Promise<Reply> {
  const response = await fetch(`${hidewright.url}/api${path}`, {
    method,
    headers: {
      cookie,
      origin: hidewright.url,
      'content-type': 'application/json',
      'idempotency-key': crypto.randomUUID(),
      ...(version !== undefined && { 'if-match': `"${version}"` }),
    },
    ...(body !== undefined && { body: JSON.stringify(body) }),
  });
  if (!response.ok)
    throw new Error(`${method} ${path}: ${response.status} ${await response.text()}`);
  cookie ||= response.headers.get('set-cookie')?.split(';')[0] ?? '';
  return (await response.json()) as Reply;
}

await call('POST', '/session', { email: 'owner@example.com', password });
const { items: patterns } = await call<{ items: { id: number; name: string }[] }>(
  'GET',
  '/patterns?limit=200',
);
const { items: customers } = await call<{ items: { id: number }[] }>('GET', '/customers');
const known = patterns.find(({ name }) => name.toLowerCase().includes('luggage tag'));
const tag = await call<Pattern>('GET', `/patterns/${known?.id}`);
const [first] = tag.definition.options ?? [];
if (!first) throw new Error('The luggage tag of the demo has an option');
const options = [first, { ...first, name: 'The same again' }];
const definition = { ...tag.definition, options };
await call('PATCH', `/patterns/${tag.id}`, { definition }, tag.version);
const basis = await call<RunBasis>('GET', `/patterns/${tag.id}/run-basis`);

const quantities = [50, 100, 250, 500, 1000];
const input: RunInput = {
  ...basis.input,
  breaks: quantities.map((quantity) => ({ quantity, typedPrice: null })),
  options: basis.options.map((option) => ({ ...option, typedExtra: null })),
};
const turns = 120;
for (let turn = 0; turn < 20; turn += 1) priceRun(input);
const before = process.cpuUsage();
for (let turn = 0; turn < turns; turn += 1) priceRun(input);
const domainMs = process.cpuUsage(before).user / 1000 / turns;

const body = {
  customerId: customers[0]?.id,
  patternId: tag.id,
  breaks: quantities.map((quantity) => ({ quantity })),
  terms: { options: options.map(({ name }) => ({ name })) },
};
const times: number[] = [];
for (let turn = 0; turn < turns; turn += 1) {
  const began = performance.now();
  await call('POST', '/quotes', body);
  times.push(performance.now() - began);
}
await hidewright.stop();
await rm(dataDir, { recursive: true });

const warm = times.slice(20).sort((a, b) => a - b);
const p95 = warm[Math.floor(warm.length * 0.95)] ?? 0;
const figure = (name: string, value: number, goal: number | null, unit = 'ms') =>
  report({ bench: 'quote', figure: name, value, unit, goal });
figure('domain, CPU', domainMs, 10);
figure('API, p95', p95, 60);
figure('domain ÷ fixed loop', domainMs / calibration, null, 'ratio');
figure('API p95 ÷ fixed loop', p95 / calibration, null, 'ratio');

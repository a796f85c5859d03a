import { mkdir, mkdtemp, realpath, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { pathToFileURL } from 'node:url';
import { ESLint, type Linter } from 'eslint';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';

interface Config {
  importDirections: (root: string) => Linter.Config[];
}

const configFile = path.resolve(import.meta.dirname, '..', '..', 'eslint.config.js');

/** A tree in the workspace's shape, where each file exports one value and one type. */
const files = [
  'packages/domain/src/round.ts',
  'packages/contract/src/quotes.ts',
  'apps/api/src/context.ts',
  'apps/api/src/app.ts',
  'apps/api/src/db/columns.ts',
  'apps/api/src/http/serve.ts',
  'apps/api/src/outside/mailer.ts',
  'apps/api/src/papers/quote-pdf.ts',
  'apps/api/src/workers/pool.ts',
  'apps/api/src/background/outbox.ts',
  'apps/api/src/flows/send-quote.ts',
  'apps/api/src/seeders/demo.ts',
  'apps/api/src/modules/quotes/quotes.routes.ts',
  'apps/api/src/modules/quotes/quotes.service.ts',
  'apps/api/src/modules/quotes/quotes.repository.ts',
  'apps/api/src/modules/quotes/quote.entity.ts',
  'apps/api/src/modules/jobs/jobs.routes.ts',
  'apps/api/src/modules/jobs/jobs.service.ts',
  'apps/api/src/modules/jobs/jobs.repository.ts',
  'apps/web/src/app/router.tsx',
  'apps/web/src/features/quotes/quotes.queries.ts',
  'apps/web/src/features/jobs/jobs.queries.ts',
  'apps/web/src/components/ticket.tsx',
  'apps/web/src/lib/api-client.ts',
  'apps/stand-ins/src/mailbox.ts',
  'tests/support/browser.ts',
  'scripts/start.mjs',
];

let root: string;
let eslint: ESLint;

beforeAll(async () => {
  root = await realpath(await mkdtemp(path.join(tmpdir(), 'directions-')));
  for (const file of files) {
    await mkdir(path.join(root, path.dirname(file)), { recursive: true });
    const type = file.endsWith('.mjs') ? '' : 'export type Shape = number;\n';
    await writeFile(path.join(root, file), `${type}export const value = 1;\n`);
  }
  const { importDirections } = (await import(pathToFileURL(configFile).href)) as Config;
  eslint = new ESLint({
    cwd: root,
    overrideConfigFile: true,
    overrideConfig: importDirections(root),
  });
});

afterAll(() => rm(root, { recursive: true }));

async function rulesBroken(file: string, code: string): Promise<string[]> {
  const [result] = await eslint.lintText(code, { filePath: path.join(root, file) });
  const broken = result?.messages.map((message) => message.ruleId ?? message.message) ?? [];
  return [...new Set(broken)];
}

function importing(file: string, target: string, kind = ''): Promise<string[]> {
  const isPackage = !/^(apps|packages|tests|scripts)\//.test(target);
  const relative = path.relative(path.dirname(file), target);
  const from = isPackage ? target : relative.startsWith('.') ? relative : `./${relative}`;
  const names = kind === 'type' ? 'type { Shape }' : '{ value }';
  return rulesBroken(file, `import ${names} from '${from}';\nexport const own = 1;\n`);
}

const domain = 'packages/domain/src/area.ts';
const contract = 'packages/contract/src/jobs.ts';
const app = 'apps/api/src/app.ts';
const routes = 'apps/api/src/modules/jobs/jobs.routes.ts';
const service = 'apps/api/src/modules/jobs/jobs.service.ts';
const flow = 'apps/api/src/flows/finish-job.ts';
const outside = 'apps/api/src/outside/cards.ts';
const paper = 'apps/api/src/papers/label.ts';
const feature = 'apps/web/src/features/jobs/jobs.queries.ts';
const component = 'apps/web/src/components/field.tsx';
const lib = 'apps/web/src/lib/format.ts';
const standIn = 'apps/stand-ins/src/cards.ts';
const aTest = 'tests/e2e/main-job.e2e.ts';
const script = 'scripts/verify.mjs';

describe('refuses', () => {
  test.each([
    ['the domain', domain, 'zod'],
    ['the domain', domain, 'node:fs'],
    ['the domain', domain, '@hidewright/contract'],
    ['the domain', domain, 'packages/contract/src/quotes.ts'],
    ['the contract', contract, '@hidewright/api'],
    ['the contract', contract, 'node:crypto'],
    ['the contract', contract, 'apps/api/src/http/serve.ts'],
    ['the API', service, '@hidewright/stand-ins'],
    ['the API', service, '@hidewright/domain/src/round.ts'],
    ['the app', app, 'apps/api/src/flows/send-quote.ts'],
    ['the app', app, 'apps/api/src/modules/quotes/quotes.service.ts'],
    ["a module's routes", routes, 'apps/api/src/modules/quotes/quotes.routes.ts'],
    ["a module's routes", routes, 'apps/api/src/modules/quotes/quotes.repository.ts'],
    ["a module's routes", routes, 'apps/api/src/app.ts'],
    ["a module's routes", routes, 'apps/api/src/papers/quote-pdf.ts'],
    ['a service', service, 'apps/api/src/modules/quotes/quotes.repository.ts'],
    ['a service', service, 'apps/api/src/modules/jobs/jobs.routes.ts'],
    ['a service', service, 'apps/api/src/flows/send-quote.ts'],
    ['a service', service, 'apps/api/src/workers/pool.ts'],
    ['a flow', flow, 'apps/api/src/modules/quotes/quotes.routes.ts'],
    ['a flow', flow, 'apps/api/src/modules/quotes/quotes.repository.ts'],
    ['a flow', flow, 'apps/api/src/outside/mailer.ts'],
    ['a flow', flow, 'apps/api/src/seeders/demo.ts'],
    ['what leaves the process', outside, 'apps/stand-ins/src/mailbox.ts'],
    ['what leaves the process', outside, '@hidewright/stand-ins'],
    ['what leaves the process', outside, 'apps/api/src/modules/quotes/quotes.service.ts'],
    ['a paper', paper, 'apps/api/src/modules/quotes/quote.entity.ts'],
    ['the pages', feature, '@hidewright/api'],
    ['the pages', feature, 'apps/api/src/http/serve.ts'],
    ['a feature', feature, 'apps/web/src/features/quotes/quotes.queries.ts'],
    ['a feature', feature, 'apps/web/src/app/router.tsx'],
    ['a component', component, 'apps/web/src/features/quotes/quotes.queries.ts'],
    ["the web's lib", lib, 'apps/web/src/components/ticket.tsx'],
    ['a stand-in', standIn, '@hidewright/contract'],
    ['a stand-in', standIn, 'apps/api/src/outside/mailer.ts'],
    ['a test', aTest, 'apps/api/src/flows/send-quote.ts'],
    ['a test', aTest, '@hidewright/domain/src/round.ts'],
    ['a test', aTest, 'scripts/start.mjs'],
    ['a script', script, 'zod'],
    ['a script', script, 'apps/api/src/context.ts'],
    ['a script', script, 'tests/support/browser.ts'],
  ])('%s (%s) importing %s', async (_, file, target) => {
    const broken = await importing(file, target);
    expect(broken).toHaveLength(1);
    expect(broken[0]).toMatch(/^(boundaries\/element-types|no-restricted-imports)$/);
  });
});

describe('allows', () => {
  test.each([
    [domain, 'packages/domain/src/round.ts', ''],
    [contract, '@hidewright/domain', ''],
    [contract, 'zod', ''],
    [app, 'apps/api/src/modules/quotes/quotes.routes.ts', ''],
    [routes, 'apps/api/src/flows/send-quote.ts', ''],
    [routes, 'apps/api/src/modules/quotes/quotes.service.ts', ''],
    [routes, 'apps/api/src/modules/jobs/jobs.repository.ts', ''],
    [service, 'apps/api/src/modules/quotes/quote.entity.ts', ''],
    [service, '@hidewright/domain', ''],
    [flow, 'apps/api/src/modules/quotes/quotes.service.ts', ''],
    [flow, 'apps/api/src/outside/mailer.ts', 'type'],
    [flow, 'apps/api/src/db/columns.ts', ''],
    [feature, 'apps/web/src/components/ticket.tsx', ''],
    [feature, '@hidewright/contract', ''],
    ['apps/web/src/app/routes/jobs.tsx', 'apps/web/src/features/jobs/jobs.queries.ts', ''],
    [aTest, '@hidewright/api', ''],
    [aTest, 'tests/support/browser.ts', ''],
    [script, 'scripts/start.mjs', ''],
  ])('%s importing %s', async (file, target, kind) => {
    expect(await importing(file, target, kind)).toEqual([]);
  });
});

test('refuses two files that import each other', async () => {
  const round = path.join(root, 'packages/domain/src/round.ts');
  await writeFile(round, "import { own } from './area.ts';\nexport const value = own;\n");
  await writeFile(path.join(root, domain), 'export const own = 1;\n');
  const broken = await rulesBroken(
    domain,
    "import { value } from './round.ts';\nexport const own = value;\n",
  );
  expect(broken).toContain('import-x/no-cycle');
});

test('refuses a file that lies in no room', async () => {
  expect(await rulesBroken('apps/api/attic/thing.ts', 'export const own = 1;\n')).toEqual([
    'boundaries/no-unknown-files',
  ]);
});

import { rmSync } from 'node:fs';
import { cp, mkdtemp, rm } from 'node:fs/promises';
import os from 'node:os';
import path from 'node:path';
import type { Piscina } from 'piscina';
import supertest from 'supertest';
import { createApp } from '../app.ts';
import { readConfig } from '../config.ts';
import { closeContext, createContext, type Context } from '../context.ts';
import { openNewShop } from '../flows/open-new-shop.ts';
import { Person } from '../modules/people/person.entity.ts';
import { hashPassword } from '../modules/people/passwords.ts';
import { SetClock } from '../outside/clock.ts';
import { inTransaction, theProgram } from '../work.ts';
import { startPool } from '../workers/pool.ts';

export const testPassword = 'a-long-password-for-tests';

const roles = ['owner', 'maker', 'bookkeeper'] as const;
type Role = (typeof roles)[number];
type Agent = ReturnType<typeof supertest.agent>;

interface TestShop {
  context: Context;
  /** Stands at Tuesday 1 December 2026, 09:00 UTC, until it is set. */
  clock: SetClock;
  /** A browser in which this role is signed in. */
  as(role: Role): Agent;
  /** A browser in which nobody is signed in. */
  nobody(): Agent;
  close(): Promise<void>;
}

/**
 * The real application on a fresh database, with an owner, a maker and a bookkeeper signed in. It need not outlive
 * the machine, so nothing waits for the disk.
 */
export async function startTestShop(settings: Record<string, string> = {}): Promise<TestShop> {
  made ??= makeShop();
  const { folder, cookies } = await made;
  const dataDir = await temporaryFolder();
  await cp(folder, dataDir, { recursive: true });
  const { context, clock, app } = await openIn(dataDir, settings);
  const agents = new Map(
    roles.map((role) => {
      const agent = supertest.agent(app);
      agent.jar.setCookie(cookies.get(role) ?? '', '127.0.0.1', '/');
      return [role, agent];
    }),
  );
  return {
    context,
    clock,
    as: (role) => agents.get(role) as Agent,
    nobody: () => supertest.agent(app),
    async close() {
      await closeContext(context);
      await rm(dataDir, { recursive: true, force: true });
    },
  };
}

const temporaryFolder = () => mkdtemp(path.join(os.tmpdir(), 'hidewright-test-'));

/** A shop that every test shop of this process is a copy of. */
interface Made {
  folder: string;
  /** What signs in each of the three. */
  cookies: ReadonlyMap<Role, string>;
}

let made: Promise<Made> | undefined;

async function makeShop(): Promise<Made> {
  const folder = await temporaryFolder();
  process.once('exit', () => {
    rmSync(folder, { recursive: true, force: true });
  });
  const { context, app } = await openIn(folder, {});
  await openWithThree(context);
  const cookies = new Map<Role, string>();
  for (const role of roles) cookies.set(role, await signedIn(app, role));
  await closeContext(context);
  return { folder, cookies };
}

/** A worker reads the whole domain in before it begins, so all shops of this process share theirs. */
let pool: Piscina | undefined;

async function openIn(dataDir: string, settings: Record<string, string>) {
  const config = readConfig({ DATA_DIR: dataDir, MODE: 'shop', LOG_LEVEL: 'silent', ...settings });
  const clock = new SetClock(new Date('2026-12-01T09:00:00.000Z'));
  pool ??= startPool();
  const context = await createContext(config, { clock, synchronous: 'OFF', pool });
  return { context, clock, app: await createApp(context) };
}

async function openWithThree(context: Context): Promise<void> {
  const passwordHash = await hashPassword(testPassword);
  await inTransaction(context, theProgram, async (work) => {
    await openNewShop(work, {
      workshopName: 'A Test Shop',
      ownerName: 'The owner',
      email: 'owner@example.com',
      passwordHash,
    });
    for (const role of roles.slice(1)) {
      work.em.create(Person, {
        email: `${role}@example.com`,
        name: `The ${role}`,
        role,
        passwordHash,
        createdAt: work.now.toISOString(),
      });
    }
  });
}

/** The cookie of a browser in which this role has signed in. */
async function signedIn(app: Parameters<typeof supertest.agent>[0], role: Role): Promise<string> {
  const reply = await supertest
    .agent(app)
    .post('/api/session')
    .send({ email: `${role}@example.com`, password: testPassword })
    .expect(200);
  const [cookie = ''] = reply.get('Set-Cookie') ?? [];
  return cookie;
}

import { mkdtemp, rm } from 'node:fs/promises';
import os from 'node:os';
import path from 'node:path';
import supertest from 'supertest';
import { createApp } from '../app.ts';
import { readConfig } from '../config.ts';
import { closeContext, createContext, type Context } from '../context.ts';
import { openNewShop } from '../flows/open-new-shop.ts';
import { Person } from '../modules/people/person.entity.ts';
import { hashPassword } from '../modules/people/passwords.ts';
import { SetClock } from '../outside/clock.ts';
import { inTransaction, theProgram } from '../work.ts';

export const testPassword = 'a-long-password-for-tests';

type Role = 'owner' | 'maker' | 'bookkeeper';
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

/** The real application on a fresh database, with an owner, a maker and a bookkeeper signed in. */
export async function startTestShop(settings: Record<string, string> = {}): Promise<TestShop> {
  const dataDir = await mkdtemp(path.join(os.tmpdir(), 'hidewright-test-'));
  const config = readConfig({ DATA_DIR: dataDir, MODE: 'shop', LOG_LEVEL: 'silent', ...settings });
  const clock = new SetClock(new Date('2026-12-01T09:00:00.000Z'));
  const context = await createContext(config, clock);
  await openWithThree(context);
  const app = await createApp(context);
  const agents = new Map<Role, Agent>();
  for (const role of ['owner', 'maker', 'bookkeeper'] as const)
    agents.set(role, await signedIn(app, role));
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

async function openWithThree(context: Context): Promise<void> {
  const passwordHash = await hashPassword(testPassword);
  await inTransaction(context, theProgram, async (work) => {
    await openNewShop(work, {
      workshopName: 'A Test Shop',
      ownerName: 'The owner',
      email: 'owner@example.com',
      passwordHash,
    });
    for (const role of ['maker', 'bookkeeper'] as const) {
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

async function signedIn(app: Parameters<typeof supertest.agent>[0], role: Role): Promise<Agent> {
  const agent = supertest.agent(app);
  await agent
    .post('/api/session')
    .send({ email: `${role}@example.com`, password: testPassword })
    .expect(200);
  return agent;
}

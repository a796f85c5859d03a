import { mkdir } from 'node:fs/promises';
import path from 'node:path';
import { MikroORM } from '@mikro-orm/sqlite';
import type { LotLayout } from '@hidewright/contract';
import { pino, type Logger } from 'pino';
import type { Piscina } from 'piscina';
import { databaseFile, type Config } from './config.ts';
import { assertSound } from './db/sound.ts';
import { ormConfig } from './mikro-orm.config.ts';
import { Workshop } from './modules/workshop/workshop.entity.ts';
import { systemClock, type Clock } from './outside/clock.ts';
import { FileStore } from './outside/file-store.ts';
import { connectMail, type Mailer } from './outside/mailer.ts';
import { papers, type Papers } from './papers/papers.ts';
import { startWorkers, type Workers } from './workers/pool.ts';
import { Searches } from './workers/searches.ts';

/** What a request needs, built once and handed in. */
export interface Context {
  config: Config;
  orm: MikroORM;
  clock: Clock;
  log: Logger;
  mailer: Mailer;
  files: FileStore;
  papers: Papers;
  workers: Workers;
  /** Long searches under way. */
  searches: Searches<LotLayout>;
}

/** What a test or the making of a demo brings of its own. */
interface Brought {
  clock?: Clock;
  synchronous?: 'FULL' | 'OFF';
  pool?: Piscina;
}

/** Opens the data folder and what lies in it. */
export async function createContext(
  config: Config,
  { clock = systemClock, synchronous = 'FULL', pool }: Brought = {},
): Promise<Context> {
  await mkdir(config.dataDir, { recursive: true });
  const orm = await MikroORM.init(ormConfig(databaseFile(config.dataDir), synchronous));
  await orm.getMigrator().up();
  await assertSound(orm);
  await assertMode(orm, config);
  return {
    config,
    orm,
    clock,
    log: pino({
      level: config.logLevel,
      redact: ['req.headers.cookie', 'res.headers["set-cookie"]'],
    }),
    mailer: connectMail(config),
    files: new FileStore(path.join(config.dataDir, 'files')),
    papers,
    workers: startWorkers(config, pool),
    searches: new Searches(),
  };
}

/** A demo workshop is never opened as a shop, nor the other way round. */
async function assertMode(orm: MikroORM, { mode, dataDir }: Config): Promise<void> {
  const workshop = await orm.em.fork().findOne(Workshop, 1);
  if (workshop === null || workshop.mode === mode) return;
  await orm.close(true);
  const other = workshop.mode === 'demo' ? 'the demo workshop' : 'a real shop';
  throw new Error(
    `${dataDir} holds ${other}. Start it as that, or set DATA_DIR to another folder.`,
  );
}

export async function closeContext(context: Context): Promise<void> {
  await context.searches.close();
  await context.workers.close();
  await context.orm.close(true);
}

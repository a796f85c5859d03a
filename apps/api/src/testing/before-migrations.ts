import { mkdtemp, rm } from 'node:fs/promises';
import os from 'node:os';
import path from 'node:path';
import { MikroORM } from '@mikro-orm/sqlite';
import { afterAll, beforeAll } from 'vitest';
import { ormConfig } from '../mikro-orm.config.ts';

interface BeforeMigrations {
  /** Brings it up to a release, or to this one. */
  up(to?: string): Promise<unknown>;
  run<Row>(sql: string): Promise<Row[]>;
}

/** An empty database for the tests of a file, so that rows of an earlier release can be written and brought up. */
export function beforeMigrations(): BeforeMigrations {
  let folder: string;
  let orm: MikroORM;
  beforeAll(async () => {
    folder = await mkdtemp(path.join(os.tmpdir(), 'hidewright-before-'));
    orm = await MikroORM.init(ormConfig(path.join(folder, 'before.sqlite')));
  });
  afterAll(async () => {
    await orm.close();
    await rm(folder, { recursive: true, force: true });
  });
  return {
    up: (to) => orm.getMigrator().up(to === undefined ? undefined : { to }),
    run: <Row>(sql: string) => orm.em.getConnection().execute<Row[]>(sql),
  };
}

import { Migrator } from '@mikro-orm/migrations';
import { defineConfig, type Options } from '@mikro-orm/sqlite';
import { writePool } from './db/connection.ts';
import { entities } from './db/entities.ts';
import { migrations } from './migrations/migrations.ts';

/** `synchronous: 'OFF'` is for a file that is thrown away unless it is completed, such as a demo being made. */
export function ormConfig(file: string, synchronous: 'FULL' | 'OFF' = 'FULL'): Options {
  return defineConfig({
    dbName: file,
    entities,
    pool: writePool(synchronous),
    extensions: [Migrator],
    migrations: {
      migrationsList: migrations,
      snapshot: false,
      silent: true,
      tableName: 'migration',
      transactional: true,
    },
    forceUndefined: false,
    validate: true,
  });
}

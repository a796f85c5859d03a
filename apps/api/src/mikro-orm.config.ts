import { Migrator } from '@mikro-orm/migrations';
import { TsMorphMetadataProvider } from '@mikro-orm/reflection';
import { defineConfig, type Options } from '@mikro-orm/sqlite';
import { writePool } from './db/connection.ts';
import { entities } from './db/entities.ts';
import { cacheDir, WholeFileCache } from './db/whole-file-cache.ts';
import { migrations } from './migrations/migrations.ts';

/** `synchronous: 'OFF'` is for a file that is thrown away unless it is completed, such as a demo being made. */
export function ormConfig(file: string, synchronous: 'FULL' | 'OFF' = 'FULL'): Options {
  return defineConfig({
    dbName: file,
    entities,
    metadataProvider: TsMorphMetadataProvider,
    metadataCache: { adapter: WholeFileCache, options: { cacheDir } },
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

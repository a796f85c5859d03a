import { randomUUID } from 'node:crypto';
import { renameSync } from 'node:fs';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { FileCacheAdapter } from '@mikro-orm/core';

export const cacheDir = fileURLToPath(
  new URL('../../node_modules/.cache/mikro-orm', import.meta.url),
);

/** What reflection found, kept in files that are always whole: two processes may start at once, and one may be ended while it writes. */
export class WholeFileCache extends FileCacheAdapter {
  override set(name: string, data: unknown, origin: string): void {
    const unfinished = `${name}.${randomUUID()}`;
    super.set(unfinished, data, origin);
    renameSync(path.join(cacheDir, `${unfinished}.json`), path.join(cacheDir, `${name}.json`));
  }
}

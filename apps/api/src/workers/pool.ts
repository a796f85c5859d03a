import os from 'node:os';
import { Piscina } from 'piscina';
import { NotWorkable, type Layout, type LayoutInput } from '@hidewright/domain';
import { databaseFile, type Config } from '../config.ts';
import type { LayoutAnswer } from './layout.ts';
import type { SheetRequest } from './sheet.ts';

/** Heavy work, done off the main thread; each kind has one entry. */
export interface Workers {
  /** @throws {NotWorkable} when the input cannot be laid out */
  layOut(input: LayoutInput): Promise<Layout>;
  /** The bytes of the sales sheet of a period. */
  salesSheet(period: Omit<SheetRequest, 'database'>): Promise<Uint8Array>;
  close(): Promise<void>;
}

export function startWorkers(config: Config): Workers {
  const pool = new Piscina({
    filename: new URL('./entry.mjs', import.meta.url).href,
    // The worker brings its own loader; the parent's would load it a second time.
    execArgv: [],
    minThreads: 0,
    maxThreads: Math.max(1, Math.min(2, os.availableParallelism())),
    idleTimeout: 60_000,
  });
  const database = databaseFile(config.dataDir);
  return {
    layOut: async (input) => layoutOf((await pool.run(input, { name: 'layOut' })) as LayoutAnswer),
    salesSheet: (period) =>
      pool.run({ ...period, database }, { name: 'salesSheet' }) as Promise<Uint8Array>,
    close: () => pool.close(),
  };
}

function layoutOf(answer: LayoutAnswer): Layout {
  if ('refusal' in answer) throw new NotWorkable(answer.refusal);
  return answer.layout;
}

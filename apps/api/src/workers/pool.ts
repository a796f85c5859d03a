import os from 'node:os';
import { Piscina } from 'piscina';
import {
  NotWorkable,
  type Layout,
  type LayoutInput,
  type SideInput,
  type SideLayout,
} from '@hidewright/domain';
import { databaseFile, type Config } from '../config.ts';
import type { ListSheet } from '../papers/list-sheet.ts';
import type { LayoutAnswer, SideFound } from './layout.ts';
import type { SheetRequest } from './sheet.ts';
import { watched, type SearchWatch } from './watched.ts';

/** Heavy work, done off the main thread; each kind has one entry. */
export interface Workers {
  /** @throws {NotWorkable} when the input cannot be laid out */
  layOut(input: LayoutInput): Promise<Layout>;
  /** The same on a drawn side. @throws {NotWorkable} */
  layOutSide(input: SideInput): Promise<SideLayout>;
  /** The same while somebody watches, who may stop it. @throws {NotWorkable} */
  searchSide(input: SideInput, watch: SearchWatch): Promise<SideFound>;
  /** The bytes of the sales sheet of a period. */
  salesSheet(period: Omit<SheetRequest, 'database'>): Promise<Uint8Array>;
  /** The bytes of a list as a spreadsheet. */
  listSheet(sheet: ListSheet): Promise<Uint8Array>;
  close(): Promise<void>;
}

/** Threads that wait for work, at most two. */
export const startPool = (): Piscina =>
  new Piscina({
    filename: new URL('./entry.mjs', import.meta.url).href,
    // The worker brings its own loader; the parent's would load it a second time.
    execArgv: [],
    minThreads: 0,
    maxThreads: Math.max(1, Math.min(2, os.availableParallelism())),
    idleTimeout: 60_000,
  });

/** @param shared a pool that others use as well, and that stays open when these close */
export function startWorkers(config: Config, shared?: Piscina): Workers {
  const pool = shared ?? startPool();
  const database = databaseFile(config.dataDir);
  return {
    layOut: async (input) => layoutOf<Layout>(await pool.run(input, { name: 'layOut' })),
    layOutSide: async (input) =>
      layoutOf<SideLayout>(await pool.run(input, { name: 'layOutSide' })),
    searchSide: (input, watch) =>
      watched(input, watch, async (work) =>
        layoutOf<SideFound>(
          await pool.run(work, { name: 'searchSide', transferList: [work.port] }),
        ),
      ),
    salesSheet: (period) =>
      pool.run({ ...period, database }, { name: 'salesSheet' }) as Promise<Uint8Array>,
    listSheet: (sheet) => pool.run(sheet, { name: 'listSheet' }) as Promise<Uint8Array>,
    close: async () => {
      if (shared === undefined) await pool.close();
    },
  };
}

function layoutOf<Laid>(given: unknown): Laid {
  const answer = given as LayoutAnswer<Laid>;
  if ('refusal' in answer) throw new NotWorkable(answer.refusal);
  return answer.layout;
}

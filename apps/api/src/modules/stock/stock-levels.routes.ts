import { Router } from 'express';
import {
  readMovementsFile,
  readStockLevels,
  readStockLevelsFile,
  type QueryOf,
  type StockLevels,
} from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { dayOver } from '../../day-in.ts';
import { readOwedToJobs } from '../../flows/check/owed-to-jobs.ts';
import { invalid } from '../../http/problem.ts';
import { serve, serveFile } from '../../http/serve.ts';
import type { Work } from '../../work.ts';
import { Workshop } from '../workshop/workshop.entity.ts';
import { readMovements } from './read-ledger.ts';
import { readLevels } from './read-levels.ts';
import { readStandingsAt } from './read-standings-at.ts';
import { readStandings } from './read-standings.ts';
import type { Standings } from './standings.ts';
import { levelsSheet, movementsSheet } from './stock-sheets.ts';

const mostMovements = 20_000;

/** What there was at the end of a day, on the screen and as a spreadsheet; and the ledger as one. */
export function stockLevelRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, readStockLevels, (work, { query }) => levelsOn(work, query));

  serveFile(router, context, readStockLevelsFile, async (work, { query }) => {
    const levels = await levelsOn(work, query);
    const workshop = await work.em.findOneOrFail(Workshop, 1);
    const sheet = levelsSheet(workshop, levels, seesValues(work));
    return {
      name: `on-hand-${levels.on}.xlsx`,
      type: readStockLevelsFile.file ?? 'application/octet-stream',
      bytes: await context.workers.listSheet(sheet),
    };
  });

  serveFile(router, context, readMovementsFile, async (work, { query }) => {
    const movements = await readMovements(work.em, { ...query, limit: mostMovements });
    const workshop = await work.em.findOneOrFail(Workshop, 1);
    const sheet = movementsSheet(workshop, movements, seesValues(work));
    return {
      name: `stock-ledger-${work.today}.xlsx`,
      type: readMovementsFile.file ?? 'application/octet-stream',
      bytes: await context.workers.listSheet(sheet),
    };
  });

  return router;
}

const seesValues = ({ actor }: Work): boolean => actor.role !== 'maker';

async function levelsOn(
  work: Work,
  { on = work.today, ...item }: QueryOf<typeof readStockLevels>,
): Promise<StockLevels> {
  if (on > work.today) throw invalid([{ field: 'on', message: 'Choose today or an earlier day.' }]);
  return readLevels(work.em, { on, standings: await standingsOn(work, on), ...item });
}

async function standingsOn({ em, today }: Work, on: string): Promise<Standings> {
  if (on === today) return readStandings(em, await readOwedToJobs(em));
  const { timeZone } = await em.findOneOrFail(Workshop, 1);
  const then = dayOver(timeZone, on);
  return readStandingsAt(em, then, await readOwedToJobs(em, then));
}

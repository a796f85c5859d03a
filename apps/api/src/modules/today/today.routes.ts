import { Router } from 'express';
import { readToday, type Role, type Today } from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { serve } from '../../http/serve.ts';
import type { Work } from '../../work.ts';
import { earned } from './earned.ts';
import { fourWeeks } from './four-weeks.ts';
import { owed } from './owed.ts';
import { short } from './short.ts';
import { toDos } from './to-dos.ts';

export function todayRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, readToday, (work) => todayOf(work, work.actor.role as Role));

  return router;
}

/** Each role's day: only what that role acts on. */
async function todayOf(work: Work, role: Role): Promise<Today> {
  const atBench = role !== 'bookkeeper';
  const atDesk = role !== 'maker';
  return {
    day: work.today,
    role,
    now: await toDos(work, role),
    fourWeeks: atBench ? await fourWeeks(work) : null,
    owed: atDesk ? await owed(work) : null,
    earned: role === 'owner' ? await earned(work) : null,
    short: atBench ? await short(work) : null,
  };
}

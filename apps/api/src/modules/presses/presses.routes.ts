import { Router } from 'express';
import {
  addPress,
  changePress,
  listPresses,
  readPress,
  type PressReply,
} from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { assignDefined } from '../../db/assign-defined.ts';
import { decimals } from '../../db/decimals.ts';
import { requireVersion } from '../../http/conditions.ts';
import { notFound } from '../../http/problem.ts';
import { serve } from '../../http/serve.ts';
import type { Work } from '../../work.ts';
import { logDeed } from '../activity/activity-log.ts';
import { Press } from './press.entity.ts';

export function pressRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, listPresses, async ({ em }) => {
    const presses = await em.find(Press, {}, { orderBy: { name: 'asc', id: 'asc' } });
    return { items: presses.map(toReply) };
  });

  serve(router, context, readPress, async ({ em }, { params }) =>
    toReply(await findPress(em, params.id)),
  );

  serve(router, context, addPress, async (work, { body }) => {
    const { name, ...measures } = body;
    const press = work.em.create(Press, { name, ...decimals(measures) });
    await work.em.flush();
    const action = `added the press ${press.name}`;
    await logDeed(work, { action, subjectKind: 'press', subjectId: press.id });
    return toReply(press);
  });

  serve(router, context, changePress, async (work, { params, body, ifMatch }) => {
    const press = await findPress(work.em, params.id);
    await requireVersion(work.em, { kind: 'press', id: press.id, version: press.version }, ifMatch);
    const { name, active, ...measures } = body;
    assignDefined(press, { name, active, ...decimals(measures) });
    await work.em.flush();
    await logDeed(work, {
      action: `changed the press ${press.name}`,
      subjectKind: 'press',
      subjectId: press.id,
      detail: { changed: Object.keys(body) },
    });
    return toReply(press);
  });

  return router;
}

/** @throws {Problem} 404 */
async function findPress(em: Work['em'], id: number): Promise<Press> {
  const press = await em.findOne(Press, id);
  if (press === null) throw notFound('press');
  return press;
}

const toReply = (press: Press): PressReply => ({
  id: press.id,
  name: press.name,
  bedWidthMm: press.bedWidthMm.toString(),
  bedDepthMm: press.bedDepthMm.toString(),
  throatMm: press.throatMm?.toString() ?? null,
  shutHeightMm: press.shutHeightMm?.toString() ?? null,
  ruleMm: press.ruleMm?.toString() ?? null,
  reliefAreaMm2: press.reliefAreaMm2?.toString() ?? null,
  active: press.active,
  version: press.version,
});

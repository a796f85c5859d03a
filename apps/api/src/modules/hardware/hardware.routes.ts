import { Router } from 'express';
import { addHardware, changeHardware, listHardware, readHardware } from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { requireVersion } from '../../http/conditions.ts';
import { readCursor, toPage } from '../../http/paging.ts';
import { notFound } from '../../http/problem.ts';
import { serve } from '../../http/serve.ts';
import type { Work } from '../../work.ts';
import { logDeed } from '../activity/activity-log.ts';
import { Hardware } from './hardware.entity.ts';
import { readHardwareList, readOneHardware } from './read-hardware.ts';
import { createHardware, updateHardware } from './save-hardware.ts';

export function hardwareRoutes(context: Context): Router {
  const router = Router();

  serve(router, context, listHardware, async ({ em }, { query }) => {
    const { cursor, limit, ...filters } = query;
    const rows = await readHardwareList(em, {
      ...filters,
      below: readCursor(cursor),
      limit: limit + 1,
    });
    return toPage(rows, limit, (row) => row.id);
  });

  serve(router, context, readHardware, async ({ em }, { params }) =>
    readOneHardware(em, params.id),
  );

  serve(router, context, addHardware, async (work, { body }) => {
    const hardware = await createHardware(work, body);
    await log(work, hardware, 'added');
    return readOneHardware(work.em, hardware.id);
  });

  serve(router, context, changeHardware, async (work, { params, body, ifMatch }) => {
    const hardware = await work.em.findOne(Hardware, params.id);
    if (hardware === null) throw notFound('hardware');
    await requireVersion(
      work.em,
      { kind: 'hardware', id: hardware.id, version: hardware.version },
      ifMatch,
    );
    await updateHardware(work, hardware, body);
    await log(work, hardware, 'changed', { changed: Object.keys(body) });
    return readOneHardware(work.em, hardware.id);
  });

  return router;
}

function log(
  work: Work,
  hardware: Hardware,
  verb: 'added' | 'changed',
  detail: Record<string, unknown> = {},
) {
  return logDeed(work, {
    action: `${verb} ${hardware.kind} ${hardware.name}`,
    subjectKind: 'hardware',
    subjectId: hardware.id,
    detail,
  });
}

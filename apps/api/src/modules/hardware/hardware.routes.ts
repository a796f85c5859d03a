import { Router } from 'express';
import { Decimal } from 'decimal.js';
import { addHardware, changeHardware, listHardware, readHardware } from '@hidewright/contract';
import type { Context } from '../../context.ts';
import { assignDefined } from '../../db/assign-defined.ts';
import { requireVersion } from '../../http/conditions.ts';
import { requireFreeName } from '../../http/free-name.ts';
import { readCursor, toPage } from '../../http/paging.ts';
import { invalid, notFound } from '../../http/problem.ts';
import { serve } from '../../http/serve.ts';
import type { Work } from '../../work.ts';
import { logDeed } from '../activity/activity-log.ts';
import { Supplier } from '../suppliers/supplier.entity.ts';
import { Hardware } from './hardware.entity.ts';
import { readHardwareList, readOneHardware } from './read-hardware.ts';

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
    await requireFreeName(work.em, Hardware, body.name);
    await requireSupplier(work, body.supplierId);
    const hardware = work.em.create(Hardware, { ...body, unitPrice: new Decimal(body.unitPrice) });
    await work.em.flush();
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
    if (body.name !== undefined) await requireFreeName(work.em, Hardware, body.name, hardware.id);
    await requireSupplier(work, body.supplierId);
    const { unitPrice, ...plain } = body;
    assignDefined(hardware, plain);
    if (unitPrice !== undefined) hardware.unitPrice = new Decimal(unitPrice);
    await work.em.flush();
    await log(work, hardware, 'changed', { changed: Object.keys(body) });
    return readOneHardware(work.em, hardware.id);
  });

  return router;
}

async function requireSupplier(work: Work, id: number | null | undefined): Promise<void> {
  if (id === null || id === undefined || (await work.em.findOne(Supplier, id)) !== null) return;
  throw invalid([{ field: 'supplierId', message: 'Choose a supplier from the list.' }]);
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

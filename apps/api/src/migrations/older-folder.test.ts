import { mkdtemp, rm } from 'node:fs/promises';
import os from 'node:os';
import path from 'node:path';
import { MikroORM } from '@mikro-orm/sqlite';
import { expect, it } from 'vitest';
import { databaseFile, readConfig } from '../config.ts';
import { closeContext, createContext } from '../context.ts';
import { ormConfig } from '../mikro-orm.config.ts';
import { Lot } from '../modules/lots/lot.entity.ts';

const rows = [
  `INSERT INTO leather (id, name, tannage, colour, finish, price_per_ft2, active)
   VALUES (1, 'Oak tan', '', '', '', 90000, 1)`,
  `INSERT INTO lot (id, tag, leather_id, form, measured_area_mm2, pieces, cost,
     grade, shade, place, supplier_lot, received_on, outline)
   VALUES (7, 'T-0007', 1, 'side', 2000000000, 1, 20000,
     '', '', '', '', '2026-11-30', '[{"x":0,"y":0},{"x":9,"y":0},{"x":0,"y":9}]')`,
];

it('a data folder from before photos opens, its drawings as they were', async () => {
  const dataDir = await mkdtemp(path.join(os.tmpdir(), 'hidewright-older-'));
  const config = readConfig({ DATA_DIR: dataDir, MODE: 'shop', LOG_LEVEL: 'silent' });
  const older = await MikroORM.init(ormConfig(databaseFile(dataDir), 'FULL'));
  await older.getMigrator().up({ to: 'migration-20261201-the-sides' });
  for (const row of rows) await older.em.getConnection().execute(row);
  await older.close(true);

  const context = await createContext(config);
  const lot = await context.orm.em.fork().findOneOrFail(Lot, 7);
  expect(lot).toMatchObject({
    tag: 'T-0007',
    photoHash: null,
    photoPlace: null,
    weightOz: null,
  });
  expect(lot.outline).toHaveLength(3);
  await closeContext(context);
  await rm(dataDir, { recursive: true, force: true });
});

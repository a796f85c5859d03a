import { hardwareUnits } from '@hidewright/domain';
import { z } from 'zod';
import { confidential } from './confidential.ts';
import { endpoint } from './endpoint.ts';
import { day, id } from './fields.ts';

/** How it stood at the end of the day beside what was there. */
const standing = z
  .object({
    /** On the shelf, and held for jobs. */
    reserved: z.string(),
    free: z.string(),
    /** Ordered from suppliers and not here yet. */
    onOrder: z.string(),
    /** What jobs need and the shelf does not hold for them: promised from what is still to come. */
    promised: z.string(),
  })
  .meta({ id: 'StockStanding' });

const lotLevel = z.object({
  lotId: id,
  tag: z.string(),
  form: z.string(),
  place: z.string(),
  areaMm2: z.string(),
  value: confidential(z.string()),
});

/** Leather of a lot that was out with a supplier to be worked on. */
const lotOut = z
  .object({
    lotId: id,
    tag: z.string(),
    leatherName: z.string(),
    service: z.string(),
    supplierName: z.string(),
    purchaseOrderNumber: z.string(),
    areaMm2: z.string(),
    value: confidential(z.string()),
  })
  .meta({ id: 'LotOut' });
export type LotOut = z.infer<typeof lotOut>;

export const leatherLevel = z
  .object({
    leatherId: id,
    name: z.string(),
    areaMm2: z.string(),
    value: confidential(z.string()),
    /** Areas in mm². */
    standing,
    lots: z.array(lotLevel),
  })
  .meta({ id: 'LeatherLevel' });
export type LeatherLevel = z.infer<typeof leatherLevel>;

export const hardwareLevel = z
  .object({
    hardwareId: id,
    name: z.string(),
    kind: z.enum(['hardware', 'supplies']),
    unit: z.enum(hardwareUnits),
    quantity: z.int(),
    value: confidential(z.string()),
    /** In units. */
    standing,
  })
  .meta({ id: 'HardwareLevel' });
export type HardwareLevel = z.infer<typeof hardwareLevel>;

/** The whole kits that the parts on hand made up: they are in none of the sums, since their parts are. */
const kitLevel = z
  .object({
    hardwareId: id,
    name: z.string(),
    quantity: z.int(),
    parts: z.array(z.object({ name: z.string(), quantity: z.int() })),
  })
  .meta({ id: 'KitLevel' });
export type KitLevel = z.infer<typeof kitLevel>;

export const stockLevels = z
  .object({
    /** The end of this day. */
    on: z.string(),
    leathers: z.array(leatherLevel),
    hardware: z.array(hardwareLevel),
    kits: z.array(kitLevel),
    leatherAreaMm2: z.string(),
    leatherValue: confidential(z.string()),
    hardwareValue: confidential(z.string()),
    /** The shop's own leather that was out to be worked on: beside what was on hand, not in it. */
    out: z.array(lotOut),
    outAreaMm2: z.string(),
    outValue: confidential(z.string()),
    value: confidential(z.string()),
  })
  .meta({ id: 'StockLevels' });
export type StockLevels = z.infer<typeof stockLevels>;

const everybody = ['owner', 'maker', 'bookkeeper'] as const;
const asked = z.strictObject({
  /** Today, where it is left out. */
  on: day.optional(),
  hardwareId: z.coerce.number().int().positive().optional(),
  leatherId: z.coerce.number().int().positive().optional(),
});

export const readStockLevels = endpoint({
  method: 'GET',
  path: '/stock-levels',
  summary: 'What was on hand of everything at the end of a day, and what it was worth',
  access: everybody,
  query: asked,
  reply: stockLevels,
});

export const readStockLevelsFile = endpoint({
  method: 'GET',
  path: '/stock-levels/file',
  summary: 'The same as a spreadsheet',
  access: everybody,
  query: asked,
  file: 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet',
  reply: z.unknown(),
});

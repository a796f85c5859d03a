import { z } from 'zod';
import { confidential } from './confidential.ts';
import { endpoint } from './endpoint.ts';
import { areaMm2, count, day, id, line, page, pageQuery } from './fields.ts';

export const movementKinds = ['receive', 'take', 'return', 'reject', 'adjust', 'count'] as const;
export type MovementKind = (typeof movementKinds)[number];

/** Whose stock: of a lot an area, of hardware a count. */
const itemFields = {
  lotId: id.nullable(),
  lotTag: z.string().nullable(),
  hardwareId: id.nullable(),
  hardwareName: z.string().nullable(),
  areaMm2: z.string().nullable(),
  quantity: z.int().nullable(),
};

export const stockMovement = z
  .object({
    id,
    at: z.string(),
    day: z.string(),
    kind: z.enum(movementKinds),
    ...itemFields,
    /** Signed like the movement, at cost. */
    value: confidential(z.string()),
    jobId: id.nullable(),
    jobNumber: z.string().nullable(),
    purchaseOrderId: id.nullable(),
    purchaseOrderNumber: z.string().nullable(),
    reason: z.string(),
    actorName: z.string(),
  })
  .meta({ id: 'StockMovement' });
export type StockMovement = z.infer<typeof stockMovement>;

export const stockReservation = z
  .object({ id, jobId: id, jobNumber: z.string(), ...itemFields })
  .meta({ id: 'StockReservation' });
export type StockReservation = z.infer<typeof stockReservation>;

const everybody = ['owner', 'maker', 'bookkeeper'] as const;
const idQuery = z.coerce.number().int().positive().optional();

const spreadsheet = 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet';

/** Of everything, or of what is named. */
const movementFilters = {
  lotId: idQuery,
  hardwareId: idQuery,
  leatherId: idQuery,
  jobId: idQuery,
  orderId: idQuery,
  purchaseOrderId: idQuery,
  kind: z.enum(movementKinds).optional(),
  /** Who moved it, by a part of the name. */
  person: z.string().trim().max(80).optional(),
  from: day.optional(),
  to: day.optional(),
};

export const listStockMovements = endpoint({
  method: 'GET',
  path: '/stock-movements',
  summary: 'The stock ledger, newest first',
  access: everybody,
  query: pageQuery.omit({ q: true }).extend(movementFilters),
  reply: page(stockMovement),
});

export const readMovementsFile = endpoint({
  method: 'GET',
  path: '/stock-movements/file',
  summary: 'Those movements as a spreadsheet, at most the newest 20,000',
  access: everybody,
  query: z.strictObject(movementFilters),
  file: spreadsheet,
  reply: z.unknown(),
});

export const listReservations = endpoint({
  method: 'GET',
  path: '/reservations',
  summary: 'What is held for jobs',
  access: everybody,
  query: pageQuery
    .omit({ q: true })
    .extend({ lotId: idQuery, hardwareId: idQuery, jobId: idQuery }),
  reply: page(stockReservation),
});

const fitsARack = (text: string) => Number(text) <= 9_290_304_000;
const reason = line(200, 'Say why, in a few words, such as counted on the shelf.');

export const adjustStock = endpoint({
  method: 'POST',
  path: '/adjustments',
  summary: 'Set what is on hand to what was measured or counted',
  access: ['owner', 'maker'],
  creates: true,
  body: z.discriminatedUnion(
    'of',
    [
      z.strictObject({
        of: z.literal('lot'),
        lotId: id,
        areaMm2: areaMm2.refine(fitsARack, 'Enter at most 100,000 ft².'),
        /** What the books said when it was measured: refused where something moved since. */
        onHandSeenAreaMm2: areaMm2.optional(),
        reason,
      }),
      z.strictObject({
        of: z.literal('hardware'),
        hardwareId: id,
        counted: count,
        /** What the books said when it was counted: refused where something moved since. */
        onHandSeenQuantity: count.optional(),
        reason,
      }),
    ],
    'Choose a lot, or hardware.',
  ),
  reply: z.object({
    /** Nothing, where the books agreed with the rack. */
    movement: stockMovement.nullable(),
    /** What is held for jobs and no longer all there. */
    broken: z.array(stockReservation),
  }),
});

import { z } from 'zod';
import { confidential } from './confidential.ts';
import { endpoint } from './endpoint.ts';
import {
  count,
  id,
  idParams,
  line,
  page,
  pageQuery,
  positiveCount,
  unitPrice,
  version,
} from './fields.ts';
import { hardwareDetails, hardwareDetailsKept, hardwareDetailsUnsaid } from './hardware-details.ts';

export const hardwareKinds = ['hardware', 'supplies'] as const;

const typed = {
  name: line(80, 'Enter a name, such as Copper rivet 9 mm.'),
  kind: z.enum(hardwareKinds, 'Choose hardware or supplies.'),
  unitPrice,
  packSize: positiveCount,
  reorderAt: count,
  supplierId: id.nullable(),
  ...hardwareDetails,
};

export const hardware = z
  .object({
    id,
    name: z.string(),
    kind: z.enum(hardwareKinds),
    unitPrice: confidential(z.string()),
    packSize: z.int(),
    reorderAt: z.int(),
    supplierId: id.nullable(),
    supplierName: z.string().nullable(),
    ...hardwareDetailsKept,
    active: z.boolean(),
    /** Of a kit: the most that its parts make up. */
    onHand: z.int(),
    reserved: z.int(),
    free: z.int(),
    /** Ordered from suppliers and not here yet. */
    onOrder: z.int(),
    /** Free and on order together are below what the owner wants to hold. */
    short: z.boolean(),
    /** What is on hand, at cost. */
    valueOnHand: confidential(z.string()),
    version,
  })
  .meta({ id: 'Hardware' });
export type Hardware = z.infer<typeof hardware>;

const everybody = ['owner', 'maker', 'bookkeeper'] as const;

export const listHardware = endpoint({
  method: 'GET',
  path: '/hardware',
  summary: 'Hardware and supplies with their counts',
  access: everybody,
  query: pageQuery.extend({
    kind: z.enum(hardwareKinds).optional(),
    short: z.enum(['yes', 'no']).optional(),
  }),
  reply: page(hardware),
});

export const readHardware = endpoint({
  method: 'GET',
  path: '/hardware/{id}',
  summary: 'One kind of hardware or supplies',
  access: everybody,
  params: idParams,
  reply: hardware,
});

export const addHardware = endpoint({
  method: 'POST',
  path: '/hardware',
  summary: 'Add hardware or supplies',
  access: ['owner'],
  creates: true,
  body: z.strictObject({
    ...typed,
    kind: typed.kind.default('hardware'),
    packSize: typed.packSize.default(1),
    reorderAt: typed.reorderAt.default(0),
    supplierId: typed.supplierId.default(null),
    ...hardwareDetailsUnsaid,
  }),
  reply: hardware,
});

export const changeHardware = endpoint({
  method: 'PATCH',
  path: '/hardware/{id}',
  summary: 'Change hardware or supplies',
  access: ['owner'],
  edits: true,
  params: idParams,
  body: z.strictObject({ ...typed, active: z.boolean() }).partial(),
  reply: hardware,
});

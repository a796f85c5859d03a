import { z } from 'zod';
import { confidential } from './confidential.ts';
import { endpoint } from './endpoint.ts';
import {
  areaMm2,
  id,
  idParams,
  line,
  optionalLine,
  ounces,
  page,
  pageQuery,
  percent,
  unitPrice,
  version,
} from './fields.ts';

const leatherForms = [
  'side',
  'hide',
  'back',
  'bend',
  'shoulder',
  'double shoulder',
  'belly',
] as const;

const typed = {
  name: line(80, 'Enter a name, such as Oak tan russet 5–6 oz.'),
  tannage: optionalLine(60),
  colour: optionalLine(60),
  finish: optionalLine(60),
  weightLowOz: ounces.nullable(),
  weightHighOz: ounces.nullable(),
  pricePerFt2: unitPrice,
  supplierId: id.nullable(),
  /** What it is bought as, whole: a side of so much, of which so much can be used. */
  wholeForm: z.enum(leatherForms, 'Choose a form.').nullable(),
  wholeAreaMm2: areaMm2.refine((text) => Number(text) >= 1000, 'Enter an area above 0.').nullable(),
  wholeUsablePercent: percent.refine((text) => Number(text) >= 1, 'Enter a share from 1 to 100 %.'),
  /** Free stock below this is worth an order; null where nobody minds. */
  reorderAtMm2: areaMm2.refine((text) => Number(text) > 0, 'Enter an area above 0.').nullable(),
};

export const leather = z
  .object({
    id,
    name: z.string(),
    tannage: z.string(),
    colour: z.string(),
    finish: z.string(),
    weightLowOz: z.string().nullable(),
    weightHighOz: z.string().nullable(),
    pricePerFt2: confidential(z.string()),
    supplierId: id.nullable(),
    supplierName: z.string().nullable(),
    wholeForm: z.enum(leatherForms).nullable(),
    wholeAreaMm2: z.string().nullable(),
    wholeUsablePercent: z.string(),
    reorderAtMm2: z.string().nullable(),
    active: z.boolean(),
    /** Of all its lots together. */
    onHandAreaMm2: z.string(),
    freeAreaMm2: z.string(),
    /** Ordered from suppliers and not here yet. */
    onOrderAreaMm2: z.string(),
    version,
  })
  .meta({ id: 'Leather' });
export type Leather = z.infer<typeof leather>;

const everybody = ['owner', 'maker', 'bookkeeper'] as const;

export const listLeathers = endpoint({
  method: 'GET',
  path: '/leathers',
  summary: 'The leathers that the shop buys',
  access: everybody,
  query: pageQuery,
  reply: page(leather),
});

export const readLeather = endpoint({
  method: 'GET',
  path: '/leathers/{id}',
  summary: 'One leather',
  access: everybody,
  params: idParams,
  reply: leather,
});

export const addLeather = endpoint({
  method: 'POST',
  path: '/leathers',
  summary: 'Add a leather',
  access: ['owner'],
  creates: true,
  body: z.strictObject({
    ...typed,
    tannage: typed.tannage.default(''),
    colour: typed.colour.default(''),
    finish: typed.finish.default(''),
    weightLowOz: typed.weightLowOz.default(null),
    weightHighOz: typed.weightHighOz.default(null),
    supplierId: typed.supplierId.default(null),
    wholeForm: typed.wholeForm.default(null),
    wholeAreaMm2: typed.wholeAreaMm2.default(null),
    wholeUsablePercent: typed.wholeUsablePercent.default('85'),
    reorderAtMm2: typed.reorderAtMm2.default(null),
  }),
  reply: leather,
});

export const changeLeather = endpoint({
  method: 'PATCH',
  path: '/leathers/{id}',
  summary: 'Change a leather',
  access: ['owner'],
  edits: true,
  params: idParams,
  // No defaults here: what a change does not name must stay as it is.
  body: z.strictObject({ ...typed, active: z.boolean() }).partial(),
  reply: leather,
});

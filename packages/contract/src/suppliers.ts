import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import {
  email,
  id,
  idParams,
  line,
  optionalLine,
  page,
  pageQuery,
  paragraph,
  version,
} from './fields.ts';

const typed = {
  name: line(80, 'Enter the supplier’s name.'),
  email: z.union(
    [z.literal(''), email],
    'Enter an e-mail address such as name@example.com, or leave it empty.',
  ),
  phone: optionalLine(40),
  leadDays: z
    .int('Enter whole days.')
    .min(0, 'Enter 0 days or more.')
    .max(365, 'Enter at most 365 days.'),
  note: paragraph(2000),
};

export const supplier = z
  .object({
    id,
    name: z.string(),
    email: z.string(),
    phone: z.string(),
    leadDays: z.int(),
    note: z.string(),
    active: z.boolean(),
    version,
  })
  .meta({ id: 'Supplier' });
export type Supplier = z.infer<typeof supplier>;

const everybody = ['owner', 'maker', 'bookkeeper'] as const;

export const listSuppliers = endpoint({
  method: 'GET',
  path: '/suppliers',
  summary: 'Who the shop buys from',
  access: everybody,
  query: pageQuery,
  reply: page(supplier),
});

export const readSupplier = endpoint({
  method: 'GET',
  path: '/suppliers/{id}',
  summary: 'One supplier',
  access: everybody,
  params: idParams,
  reply: supplier,
});

export const addSupplier = endpoint({
  method: 'POST',
  path: '/suppliers',
  summary: 'Add a supplier',
  access: ['owner'],
  creates: true,
  body: z.strictObject({
    ...typed,
    email: typed.email.default(''),
    phone: typed.phone.default(''),
    leadDays: typed.leadDays.default(7),
    note: typed.note.default(''),
  }),
  reply: supplier,
});

export const changeSupplier = endpoint({
  method: 'PATCH',
  path: '/suppliers/{id}',
  summary: 'Change a supplier',
  access: ['owner'],
  edits: true,
  params: idParams,
  body: z.strictObject({ ...typed, active: z.boolean() }).partial(),
  reply: supplier,
});

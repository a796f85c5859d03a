import { z } from 'zod';
import { confidential } from './confidential.ts';
import { endpoint } from './endpoint.ts';
import {
  email,
  id,
  idParams,
  instant,
  line,
  optionalLine,
  page,
  pageQuery,
  paragraph,
  version,
} from './fields.ts';

const emailOrEmpty = z
  .string()
  .trim()
  .max(254)
  .refine(
    (text) => text === '' || email.safeParse(text).success,
    'Enter an e-mail address such as name@example.com, or leave it empty.',
  );

const typed = {
  name: line(80, 'Enter the customer’s name, such as The Copper Heron.'),
  contactName: optionalLine(80).default(''),
  /** Empty where the customer has none: quotes then go by hand. */
  email: emailOrEmpty.default(''),
  phone: optionalLine(40).default(''),
  address: paragraph(400).default(''),
  note: paragraph(2000).default(''),
};

/** Whoever orders. How to reach them is not for the maker. */
export const customer = z
  .object({
    id,
    name: z.string(),
    contactName: confidential(z.string()),
    email: confidential(z.string()),
    phone: confidential(z.string()),
    address: confidential(z.string()),
    note: confidential(z.string()),
    active: z.boolean(),
    createdAt: instant,
    version,
  })
  .meta({ id: 'Customer' });
export type Customer = z.infer<typeof customer>;

export const listCustomers = endpoint({
  method: 'GET',
  path: '/customers',
  summary: 'The customers',
  access: ['owner', 'bookkeeper'],
  query: pageQuery.extend({ active: z.enum(['yes', 'no']).optional() }),
  reply: page(customer),
});

export const readCustomer = endpoint({
  method: 'GET',
  path: '/customers/{id}',
  summary: 'One customer',
  access: ['owner', 'bookkeeper'],
  params: idParams,
  reply: customer,
});

export const addCustomer = endpoint({
  method: 'POST',
  path: '/customers',
  summary: 'Add a customer',
  access: ['owner'],
  creates: true,
  body: z.strictObject(typed),
  reply: customer,
});

export const changeCustomer = endpoint({
  method: 'PATCH',
  path: '/customers/{id}',
  summary: 'Change a customer',
  access: ['owner', 'bookkeeper'],
  edits: true,
  params: idParams,
  body: z.strictObject({
    name: typed.name.optional(),
    contactName: optionalLine(80).optional(),
    email: emailOrEmpty.optional(),
    phone: optionalLine(40).optional(),
    address: paragraph(400).optional(),
    note: paragraph(2000).optional(),
    active: z.boolean().optional(),
  }),
  reply: customer,
});

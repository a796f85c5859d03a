import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { id, idParams, line, percent, version } from './fields.ts';

const bookkeepers = ['owner', 'bookkeeper'] as const;

const name = line(60, 'Enter what the tax is called on your invoices, such as Sales tax.');

export const taxRate = z
  .object({ id, name: z.string(), percent: z.string(), active: z.boolean(), version })
  .meta({ id: 'TaxRate' });
export type TaxRate = z.infer<typeof taxRate>;

export const listTaxRates = endpoint({
  method: 'GET',
  path: '/tax-rates',
  summary: 'The tax rates that the shop entered, and what its last invoice used',
  access: bookkeepers,
  reply: z.object({
    items: z.array(taxRate),
    /** Nothing while no invoice was ever drafted: then tax must be asked for. A null rate means no tax. */
    usual: z.object({ taxRateId: id.nullable() }).nullable(),
  }),
});

export const addTaxRate = endpoint({
  method: 'POST',
  path: '/tax-rates',
  summary: 'Enter a tax rate',
  access: bookkeepers,
  creates: true,
  body: z.strictObject({ name, percent }),
  reply: taxRate,
});

/** The percentage stays: papers were made with it. A rate that changed is a new rate, and the old one is retired. */
export const changeTaxRate = endpoint({
  method: 'PATCH',
  path: '/tax-rates/{id}',
  summary: 'Rename, retire or bring back a tax rate',
  access: bookkeepers,
  edits: true,
  params: idParams,
  body: z.strictObject({ name, active: z.boolean() }).partial(),
  reply: taxRate,
});

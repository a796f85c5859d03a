import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { day, id } from './fields.ts';

const bookkeepers = ['owner', 'bookkeeper'] as const;

/** Per cent, or null for what no tax applies to. */
const percentOrNone = z.string().nullable();

export const sheetTotals = z
  .object({
    invoices: z.int(),
    net: z.string(),
    tax: z.string(),
    total: z.string(),
    payments: z.int(),
    received: z.string(),
    taxes: z.array(z.object({ percent: percentOrNone, net: z.string(), tax: z.string() })),
  })
  .meta({ id: 'SheetTotals' });
export type SheetTotals = z.infer<typeof sheetTotals>;

export const sheetInvoice = z
  .object({
    number: z.string(),
    issuedOn: z.string(),
    dueOn: z.string(),
    customerName: z.string(),
    /** Null for what was sold from the shelf. */
    orderNumber: z.string().nullable(),
    net: z.string(),
    tax: z.string(),
    total: z.string(),
  })
  .meta({ id: 'SheetInvoice' });
export type SheetInvoice = z.infer<typeof sheetInvoice>;

export const sheetLine = z
  .object({
    invoiceNumber: z.string(),
    issuedOn: z.string(),
    position: z.int(),
    description: z.string(),
    quantity: z.int(),
    unitPrice: z.string(),
    amount: z.string(),
    taxPercent: percentOrNone,
  })
  .meta({ id: 'SheetLine' });
export type SheetLine = z.infer<typeof sheetLine>;

export const sheetPayment = z
  .object({
    receivedOn: z.string(),
    invoiceNumber: z.string(),
    customerName: z.string(),
    method: z.string(),
    note: z.string(),
    amount: z.string(),
  })
  .meta({ id: 'SheetPayment' });
export type SheetPayment = z.infer<typeof sheetPayment>;

export const period = z
  .object({
    id,
    fromDay: z.string(),
    toDay: z.string(),
    totals: sheetTotals,
    lockedAt: z.string(),
    lockedBy: z.string(),
  })
  .meta({ id: 'Period' });
export type Period = z.infer<typeof period>;

export const salesSheet = z
  .object({
    fromDay: z.string(),
    toDay: z.string(),
    workshopName: z.string(),
    currency: z.string(),
    totals: sheetTotals,
    invoices: z.array(sheetInvoice),
    lines: z.array(sheetLine),
    payments: z.array(sheetPayment),
  })
  .meta({ id: 'SalesSheet' });
export type SalesSheet = z.infer<typeof salesSheet>;

const longestDays = 366;
const daysFrom = (from: string, to: string) => (Date.parse(to) - Date.parse(from)) / 86_400_000 + 1;

/** A period's days are asked for everywhere in the same way. */
function inOrder<S extends z.ZodType>(
  schema: S,
  daysOf: (value: z.output<S>) => [string, string],
  last: string,
): S {
  // A day that is no day has its own sentence already: NaN passes both.
  return schema
    .refine((value) => !(daysFrom(...daysOf(value)) < 1), {
      message: 'The last day must not be before the first day.',
      path: [last],
    })
    .refine((value) => !(daysFrom(...daysOf(value)) > longestDays), {
      message: 'Choose a period of a year or less.',
      path: [last],
    });
}

const asked = inOrder(z.strictObject({ from: day, to: day }), ({ from, to }) => [from, to], 'to');

export const readSalesSheet = endpoint({
  method: 'GET',
  path: '/sales-sheets',
  summary: 'The sales sheet of a period: totals and rows, and which of its days are locked',
  access: bookkeepers,
  query: asked,
  reply: salesSheet.extend({ locks: z.array(period) }),
});

export const readSalesSheetFile = endpoint({
  method: 'GET',
  path: '/sales-sheets/file',
  summary: 'The sales sheet of a period as a spreadsheet',
  access: bookkeepers,
  query: asked,
  file: 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet',
  reply: z.string(),
});

export const listPeriods = endpoint({
  method: 'GET',
  path: '/periods',
  summary: 'Locked periods, latest first',
  access: bookkeepers,
  reply: z.object({ items: z.array(period) }),
});

export const lockPeriod = endpoint({
  method: 'POST',
  path: '/periods',
  summary: 'Lock a period: nothing can be issued or paid into its days afterwards',
  access: bookkeepers,
  creates: true,
  body: inOrder(
    z.strictObject({ fromDay: day, toDay: day }),
    ({ fromDay, toDay }) => [fromDay, toDay],
    'toDay',
  ),
  reply: period,
});

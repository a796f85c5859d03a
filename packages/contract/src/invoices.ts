import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import {
  day,
  id,
  idParams,
  line,
  money,
  optionalLine,
  page,
  pageQuery,
  version,
} from './fields.ts';

const bookkeepers = ['owner', 'bookkeeper'] as const;

export const invoiceState = z.enum(['draft', 'issued', 'part paid', 'paid', 'credited']);
export type InvoiceState = z.infer<typeof invoiceState>;

export const paymentMethod = z.enum(['bank', 'card', 'cash', 'cheque']);
export type PaymentMethod = z.infer<typeof paymentMethod>;

const head = {
  id,
  /** A draft has no number. */
  number: z.string().nullable(),
  state: invoiceState,
  customerId: id,
  customerName: z.string(),
  /** Null where the pieces were sold from the shelf, without an order. */
  orderId: id.nullable(),
  orderNumber: z.string().nullable(),
  title: z.string(),
  issuedOn: z.string().nullable(),
  dueOn: z.string().nullable(),
  net: z.string(),
  tax: z.string(),
  total: z.string(),
  paid: z.string(),
  /** What is still owed. */
  open: z.string(),
  overdue: z.boolean(),
  version,
};

export const invoiceSummary = z.object(head).meta({ id: 'InvoiceSummary' });
export type InvoiceSummary = z.infer<typeof invoiceSummary>;

export const invoiceLine = z
  .object({
    position: z.int(),
    description: z.string(),
    quantity: z.int(),
    unitPrice: z.string(),
    amount: z.string(),
    /** Null where no tax applies; then there is no name either. */
    taxPercent: z.string().nullable(),
    taxRateId: id.nullable(),
    taxName: z.string().nullable(),
    /** What of the shelf it sells; null on the invoice of an order. */
    finishedPieceId: id.nullable(),
  })
  .meta({ id: 'InvoiceLine' });
export type InvoiceLine = z.infer<typeof invoiceLine>;

export const taxAtRate = z
  .object({ percent: z.string(), net: z.string(), tax: z.string() })
  .meta({ id: 'TaxAtRate' });

export const payment = z
  .object({
    id,
    invoiceId: id,
    invoiceNumber: z.string(),
    customerName: z.string(),
    amount: z.string(),
    receivedOn: z.string(),
    method: paymentMethod,
    note: z.string(),
    recordedBy: z.string(),
  })
  .meta({ id: 'Payment' });
export type Payment = z.infer<typeof payment>;

export const invoice = z
  .object({
    ...head,
    orderState: z.string().nullable(),
    currency: z.string(),
    /** As they stood when the invoice was issued; as they stand now on a draft. */
    billedTo: z.object({ name: z.string(), contactName: z.string(), address: z.string() }),
    lines: z.array(invoiceLine),
    taxes: z.array(taxAtRate),
    payments: z.array(payment),
    /** SHA-256 of what was issued, kept with it. */
    snapshotHash: z.string().nullable(),
  })
  .meta({ id: 'Invoice' });
export type Invoice = z.infer<typeof invoice>;

export const listInvoices = endpoint({
  method: 'GET',
  path: '/invoices',
  summary: 'Invoices, newest first',
  access: bookkeepers,
  query: pageQuery.extend({
    state: invoiceState.optional(),
    customerId: z.coerce.number().int().positive().optional(),
    /** Those of orders, or those of pieces that lay on the shelf. */
    of: z.enum(['orders', 'shelf']).optional(),
  }),
  reply: page(invoiceSummary),
});

export const readInvoice = endpoint({
  method: 'GET',
  path: '/invoices/{id}',
  summary: 'One invoice with its lines, tax and payments',
  access: bookkeepers,
  params: idParams,
  reply: invoice,
});

export const orderToInvoice = z
  .object({
    orderId: id,
    orderNumber: z.string(),
    customerName: z.string(),
    title: z.string(),
    quantity: z.int(),
    total: z.string(),
    state: z.string(),
    shippedOn: z.string().nullable(),
  })
  .meta({ id: 'OrderToInvoice' });
export type OrderToInvoice = z.infer<typeof orderToInvoice>;

export const listOrdersToInvoice = endpoint({
  method: 'GET',
  path: '/orders-to-invoice',
  summary: 'Orders that are packed or shipped and have no invoice yet, oldest first',
  access: bookkeepers,
  reply: z.object({ items: z.array(orderToInvoice) }),
});

export const draftInvoice = endpoint({
  method: 'POST',
  path: '/invoices',
  summary: 'Draft the invoice of an order that is packed or shipped',
  access: bookkeepers,
  creates: true,
  body: z.strictObject({
    orderId: z.int('Choose an order that is packed or shipped.').positive(),
    /** Null says that no tax applies; it must be said. */
    taxRateId: z.int('Choose a tax rate, or say that no tax applies.').positive().nullable(),
  }),
  reply: invoice,
});

export const changeInvoice = endpoint({
  method: 'PATCH',
  path: '/invoices/{id}',
  summary: 'Change the wording or the tax of the lines of a draft',
  access: bookkeepers,
  edits: true,
  params: idParams,
  body: z.strictObject({
    lines: z
      .array(
        z.strictObject({
          position: z.int('Name the line by its position.').positive(),
          description: line(200, 'Enter what the line is for.').optional(),
          taxRateId: z
            .int('Choose a tax rate, or say that no tax applies.')
            .positive()
            .nullable()
            .optional(),
        }),
      )
      .min(1, 'Name at least one line to change.')
      .max(50, 'Change at most 50 lines at a time.'),
  }),
  reply: invoice,
});

export const discardInvoice = endpoint({
  method: 'DELETE',
  path: '/invoices/{id}',
  summary:
    'Discard a draft; its order can be invoiced again, and what it sold lies on the shelf again',
  access: bookkeepers,
  params: idParams,
  reply: z.object({ discarded: z.literal(true) }),
});

export const removeInvoiceLine = endpoint({
  method: 'DELETE',
  path: '/invoices/{id}/lines/{position}',
  summary: 'Take what was sold from the shelf off a draft; it lies there again',
  access: bookkeepers,
  edits: true,
  params: idParams.extend({ position: z.coerce.number().int().positive() }),
  reply: invoice,
});

export const issueInvoice = endpoint({
  method: 'POST',
  path: '/invoices/{id}/issue',
  summary: 'Issue a draft: it gets the next number and never changes again',
  access: bookkeepers,
  edits: true,
  params: idParams,
  body: z.strictObject({ issuedOn: day }),
  reply: invoice,
});

export const readInvoicePaper = endpoint({
  method: 'GET',
  path: '/invoices/{id}/paper',
  summary: 'The issued invoice as PDF',
  access: bookkeepers,
  params: idParams,
  file: 'application/pdf',
  reply: z.string(),
});

export const recordPayment = endpoint({
  method: 'POST',
  path: '/invoices/{id}/payments',
  summary: 'Record money received for an issued invoice',
  access: bookkeepers,
  creates: true,
  params: idParams,
  body: z.strictObject({
    amount: money.refine((text) => Number(text) > 0, 'Enter an amount above zero.'),
    receivedOn: day,
    method: paymentMethod,
    note: optionalLine(200).default(''),
  }),
  reply: invoice,
});

export const listPayments = endpoint({
  method: 'GET',
  path: '/payments',
  summary: 'Payments, newest first',
  access: bookkeepers,
  query: pageQuery,
  reply: page(payment),
});

/** How late: not due yet, or so many days after the day it was due. */
export const ageBand = z.enum(['not due', '1 to 30', '31 to 60', '61 to 90', 'over 90']);
export type AgeBand = z.infer<typeof ageBand>;

export const owedInvoice = z
  .object({
    invoiceId: id,
    number: z.string(),
    customerName: z.string(),
    issuedOn: z.string(),
    dueOn: z.string(),
    total: z.string(),
    open: z.string(),
    daysLate: z.int(),
    band: ageBand,
  })
  .meta({ id: 'OwedInvoice' });
export type OwedInvoice = z.infer<typeof owedInvoice>;

export const listOwed = endpoint({
  method: 'GET',
  path: '/owed',
  summary: 'What customers owe today, by age, longest due first',
  access: bookkeepers,
  reply: z.object({
    onDay: z.string(),
    items: z.array(owedInvoice),
    bands: z.array(z.object({ band: ageBand, count: z.int(), open: z.string() })),
    open: z.string(),
  }),
});

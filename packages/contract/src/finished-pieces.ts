import { z } from 'zod';
import { confidential } from './confidential.ts';
import { endpoint } from './endpoint.ts';
import {
  choice,
  count,
  day,
  id,
  idParams,
  line,
  money,
  optionalLine,
  page,
  pageQuery,
  positiveCount,
  unitPrice,
  version,
} from './fields.ts';
import { invoice } from './invoices.ts';

/** What may become of a piece that leaves the shelf. */
const waysOut = ['sold', 'given', 'spoiled'] as const;

/** Finished pieces of one pattern that lie on the shelf, good ones and seconds apart. */
export const finishedPiece = z
  .object({
    id,
    patternId: id,
    patternName: z.string(),
    /** Null for the piece as it is. */
    option: z.string().nullable(),
    sort: z.enum(['good', 'seconds']),
    /** Whose mark is stamped on them; null where there is none, and anybody can have them. */
    customerId: id.nullable(),
    customerName: z.string().nullable(),
    onHand: count,
    place: z.string(),
    /** What they cost to make: leather and hardware, no wages. */
    value: confidential(z.string()),
    valueEach: confidential(z.string().nullable()),
    version,
  })
  .meta({ id: 'FinishedPiece' });
export type FinishedPiece = z.infer<typeof finishedPiece>;

export const finishedMovement = z
  .object({
    id,
    at: z.string(),
    day,
    kind: z.enum(['made', ...waysOut, 'count', 'put back']),
    /** Signed: in is positive. */
    quantity: z.int(),
    value: confidential(z.string()),
    jobId: id.nullable(),
    jobNumber: z.string().nullable(),
    /** The invoice that sells them; null where there is none, or its draft was discarded. */
    invoice: confidential(z.object({ id, number: z.string().nullable() }).nullable()),
    reason: z.string(),
    actorName: z.string(),
  })
  .meta({ id: 'FinishedMovement' });
export type FinishedMovement = z.infer<typeof finishedMovement>;

const readers = ['owner', 'maker', 'bookkeeper'] as const;
const hands = ['owner', 'maker'] as const;

export const listFinishedPieces = endpoint({
  method: 'GET',
  path: '/finished-pieces',
  summary: 'Finished pieces and seconds on the shelf, newest first',
  access: readers,
  query: pageQuery.extend({
    patternId: z.coerce.number().int().positive().optional(),
    /** Only those of which there are any. */
    there: z.enum(['yes', 'no']).optional(),
    /** Only those that this customer could have: with their mark, or with nobody's. */
    forCustomer: z.coerce.number().int().positive().optional(),
  }),
  reply: page(finishedPiece),
});

export const readFinishedPiece = endpoint({
  method: 'GET',
  path: '/finished-pieces/{id}',
  summary: 'Finished pieces of one kind',
  access: readers,
  params: idParams,
  reply: finishedPiece,
});

export const listFinishedMovements = endpoint({
  method: 'GET',
  path: '/finished-pieces/{id}/movements',
  summary: 'What came to the shelf and left it, newest first',
  access: readers,
  params: idParams,
  query: pageQuery.omit({ q: true }),
  reply: page(finishedMovement),
});

export const putOnShelf = endpoint({
  method: 'POST',
  path: '/finished-pieces',
  summary: 'Put pieces on the shelf that no job of the shop put there: found, or there from before',
  access: hands,
  creates: true,
  body: z.strictObject({
    patternId: choice('Choose a pattern.'),
    /** Null for the piece as it is. */
    option: line(60, 'Name the option.').nullable().default(null),
    sort: z.enum(['good', 'seconds'], 'Choose good ones or seconds.'),
    /** Whose mark is stamped on them. */
    customerId: id.nullable().default(null),
    quantity: positiveCount,
    /** Only the owner types it; left out, they cost what those of their kind do. */
    unitCost: money.nullable().default(null),
    /** Left empty, where those of their kind lie. */
    place: optionalLine(60).default(''),
    reason: line(200, 'Say where they come from, such as found in a box.'),
  }),
  reply: finishedPiece,
});

export const takeFinished = endpoint({
  method: 'POST',
  path: '/finished-pieces/{id}/takings',
  summary: 'Take pieces from the shelf: sold, given away or spoiled',
  access: hands,
  creates: true,
  params: idParams,
  body: z.strictObject({
    as: z.enum(waysOut, 'Choose what becomes of them.'),
    /** Who buys them or is given them; must be named where they bear a customer's mark. */
    customerId: id.nullable().default(null),
    quantity: positiveCount,
    reason: line(200, 'Say to whom or why, in a few words.'),
  }),
  reply: finishedPiece,
});

export const sellFinished = endpoint({
  method: 'POST',
  path: '/finished-pieces/{id}/sales',
  summary:
    'Sell pieces from the shelf to a customer: drafts the invoice, or adds a line to a draft from the shelf',
  access: ['owner'],
  creates: true,
  params: idParams,
  body: z.strictObject({
    customerId: choice('Choose the customer.'),
    quantity: positiveCount,
    unitPrice: unitPrice.refine(
      (text) => Number(text) !== 0,
      'Enter a price above zero, or take them from the shelf as given away.',
    ),
    /** Null says that no tax applies; it must be said. */
    taxRateId: z.int('Choose a tax rate, or say that no tax applies.').positive().nullable(),
    /** The draft that the line goes to; null for a new one. */
    draftId: id.nullable().default(null),
  }),
  reply: invoice,
});

export const countFinished = endpoint({
  method: 'POST',
  path: '/finished-pieces/{id}/counts',
  summary: 'Set what is on the shelf to what was counted',
  access: hands,
  creates: true,
  params: idParams,
  body: z.strictObject({
    counted: count,
    reason: line(200, 'Say why, in a few words, such as counted on the shelf.'),
  }),
  reply: finishedPiece,
});

export const changeFinishedPiece = endpoint({
  method: 'PATCH',
  path: '/finished-pieces/{id}',
  summary: 'Say where the pieces lie',
  access: hands,
  edits: true,
  params: idParams,
  body: z.strictObject({ place: optionalLine(60) }),
  reply: finishedPiece,
});

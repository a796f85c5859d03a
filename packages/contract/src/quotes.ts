import type { RunHardware, RunInput, RunNumbers } from '@hidewright/domain';
import { z } from 'zod';
import { confidential } from './confidential.ts';
import { design } from './designs.ts';
import { domainRecord } from './domain-record.ts';
import { endpoint } from './endpoint.ts';
import {
  day,
  id,
  idParams,
  instant,
  optionalLine,
  page,
  pageQuery,
  paperNumber,
  runQuantity,
  version,
} from './fields.ts';
import { layout } from './layouts.ts';
import { quoteBody, quoteTerms } from './quote-body.ts';

export const quoteStates = ['draft', 'sent', 'agreed', 'declined', 'superseded', 'lapsed'] as const;
export const quoteState = z.enum(quoteStates);
export type QuoteState = z.infer<typeof quoteState>;

/** How a customer can say yes other than by the link. */
export const agreedByWord = z.enum(
  ['phone', 'mail', 'counter'],
  'Choose how it was agreed: phone, mail or counter.',
);

const letter = z.object({
  state: z.enum(['waiting', 'sent', 'failed']),
  recipient: confidential(z.string()),
  sentAt: instant.nullable(),
  /** Why the last try did not work. */
  lastError: z.string().nullable(),
});

const rung = z.object({
  quantity: runQuantity,
  typedPrice: confidential(z.string().nullable()),
  priceEach: confidential(z.string()),
  /** The pieces alone. */
  goodsTotal: confidential(z.string()),
  /** Pieces and tooling. */
  total: confidential(z.string()),
});

const heading = {
  id,
  number: paperNumber,
  revision: z.int().positive(),
  state: quoteState,
  customerId: id,
  customerName: z.string(),
  patternId: id,
  patternName: z.string(),
  title: z.string(),
  inHandsOn: day.nullable(),
  validUntil: day.nullable(),
  createdAt: instant,
  sentAt: instant.nullable(),
  agreedAt: instant.nullable(),
  agreedQuantity: runQuantity.nullable(),
  agreedHow: z.enum(['link', 'phone', 'mail', 'counter']).nullable(),
  /** The order that the shop has taken on from it. */
  orderId: id.nullable(),
  orderNumber: paperNumber.nullable(),
};

export const quote = z
  .object({
    ...heading,
    /** What was taken on from it was called off since. */
    orderCancelled: z.boolean(),
    patternVersion: z.int().positive(),
    layoutId: id,
    layout,
    /** SVG path data in mm; null where there is no drawing. */
    outlinePath: z.string().nullable(),
    breaks: z.array(rung),
    tooling: z.array(
      z.object({
        name: z.string(),
        cost: confidential(z.string()),
        charge: confidential(z.string()),
      }),
    ),
    overrides: z.object({
      rejectPercent: z.string().optional(),
      leatherPricePerFt2: confidential(z.string()),
    }),
    message: confidential(z.string()),
    /** Empty in quotes of before there were any. */
    terms: confidential(quoteTerms),
    agreedOption: z.string().nullable(),
    /** The snapshot it is priced from, whole. */
    input: confidential(domainRecord<RunInput>('RunInput')),
    numbers: confidential(domainRecord<RunNumbers>('RunNumbers')),
    customerEmail: confidential(z.string()),
    /** Why it cannot go by mail, and what to do; null where it can. */
    cannotMail: confidential(z.string().nullable()),
    letter: letter.nullable(),
    /** The link that is open for the customer now. */
    link: z.object({ expiresAt: instant }).nullable(),
    /** Other revisions of the same number, newest first. */
    revisions: z.array(z.object({ id, revision: z.int().positive(), state: quoteState })),
    version,
  })
  .meta({ id: 'Quote' });
export type Quote = z.infer<typeof quote>;

/** A quote as it stands in a list. */
export const quoteRow = z
  .object({
    ...heading,
    quantities: z.array(runQuantity),
    /** What the agreed quantity, or else the largest, comes to with its tooling. */
    total: confidential(z.string()),
  })
  .meta({ id: 'QuoteRow' });
export type QuoteRow = z.infer<typeof quoteRow>;

const everybody = ['owner', 'maker', 'bookkeeper'] as const;

export const listQuotes = endpoint({
  method: 'GET',
  path: '/quotes',
  summary: 'The quotes, newest first',
  access: everybody,
  query: pageQuery.extend({
    state: quoteState.optional(),
    customerId: z.coerce.number().int().positive().optional(),
  }),
  reply: page(quoteRow),
});

export const readQuote = endpoint({
  method: 'GET',
  path: '/quotes/{id}',
  summary: 'One quote',
  access: everybody,
  params: idParams,
  reply: quote,
});

/** What the browser prices from, with the same domain function, while a quote is being typed. */
export const runBasis = z
  .object({
    patternId: id,
    patternName: z.string(),
    patternVersion: z.int().positive(),
    layout,
    outlinePath: z.string().nullable(),
    needsDie: z.boolean(),
    needsPlate: z.boolean(),
    /** Set where the customer's own runs stand in for what the pattern says. */
    design: design.nullable(),
    /** The pattern's options, each with its whole hardware. */
    options: z.array(
      z.object({ name: z.string(), hardware: domainRecord<RunHardware[]>('RunHardware') }),
    ),
    /** Complete but for what is typed on the quote: its breaks are an example, its tooling is empty. */
    input: domainRecord<RunInput>('RunInput'),
  })
  .meta({ id: 'RunBasis' });
export type RunBasis = z.infer<typeof runBasis>;

export const readRunBasis = endpoint({
  method: 'GET',
  path: '/patterns/{id}/run-basis',
  summary: 'What a run of a pattern is priced from today',
  access: ['owner'],
  params: idParams,
  /** Whose design of it, where they have one. */
  query: z.strictObject({ customerId: z.coerce.number().int().positive().optional() }),
  reply: runBasis,
});

export const createQuote = endpoint({
  method: 'POST',
  path: '/quotes',
  summary: 'Draft a quote',
  access: ['owner'],
  creates: true,
  body: quoteBody,
  reply: quote,
});

export const changeQuote = endpoint({
  method: 'PUT',
  path: '/quotes/{id}',
  summary: 'Work a draft out again from what is typed now',
  access: ['owner'],
  edits: true,
  params: idParams,
  body: quoteBody,
  reply: quote,
});

const by = z.enum(['mail', 'hand'], 'Choose how it goes out: mail or hand.');

/** A link is told once, to who made it: only its hash is kept, so no reply that holds one is kept for replay either. */
const sentQuote = z
  .object({
    quote,
    linkUrl: z.string(),
    /** To copy into whatever reaches the customer. */
    text: z.string(),
  })
  .meta({ id: 'SentQuote' });
export type SentQuote = z.infer<typeof sentQuote>;

export const sendQuote = endpoint({
  method: 'POST',
  path: '/quotes/{id}/sendings',
  summary: 'Send a draft: by mail, or by hand as a link and text to copy',
  access: ['owner'],
  edits: true,
  params: idParams,
  body: z.strictObject({ by }),
  reply: sentQuote,
});

export const renewLink = endpoint({
  method: 'POST',
  path: '/quotes/{id}/links',
  summary: 'One more link for the customer of a quote that is out, by mail or by hand',
  access: ['owner'],
  params: idParams,
  body: z.strictObject({ by }),
  reply: sentQuote,
});

export const revokeLink = endpoint({
  method: 'DELETE',
  path: '/quotes/{id}/links',
  summary: 'Stop the customer’s links',
  access: ['owner'],
  params: idParams,
  reply: quote,
});

export const agreeQuote = endpoint({
  method: 'POST',
  path: '/quotes/{id}/agreements',
  summary: 'Note that the customer agreed, by phone, mail or at the counter',
  access: ['owner'],
  params: idParams,
  body: z.strictObject({
    quantity: runQuantity,
    option: optionalLine(60).nullable().default(null),
    how: agreedByWord,
  }),
  reply: quote,
});

export const declineQuote = endpoint({
  method: 'POST',
  path: '/quotes/{id}/refusals',
  summary: 'Note that the customer declined',
  access: ['owner'],
  params: idParams,
  body: z.strictObject({ reason: optionalLine(200).default('') }),
  reply: quote,
});

export const reviseQuote = endpoint({
  method: 'POST',
  path: '/quotes/{id}/revisions',
  summary: 'A new draft under the same number',
  access: ['owner'],
  creates: true,
  params: idParams,
  reply: quote,
});

export const quotePaper = endpoint({
  method: 'GET',
  path: '/quotes/{id}/paper',
  summary: 'The quote as PDF, as the customer gets it',
  access: ['owner', 'bookkeeper'],
  params: idParams,
  reply: z.unknown(),
  file: 'application/pdf',
});

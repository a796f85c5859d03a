import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { idParams } from './fields.ts';
import { tool, toolKinds } from './tools.ts';

const pieces = (sentence: string) =>
  z.coerce.number(sentence).int(sentence).min(1, sentence).max(100_000, sentence);

const customerSentence = 'Choose a customer from the list.';
const repeatsSentence = 'Enter how many more runs you expect, from 0 to 100.';

/** What the run asks of a die or a plate, and what is there for it. */
const toolForRun = z.object({
  kind: z.enum(toolKinds),
  /** Cuts or impressions of this run; of a die that cuts several pieces at once, fewer than the pieces. */
  strikes: z.int(),
  /** Of this run and the runs expected after it. */
  strikesInAll: z.int(),
  /** The one that a job would get now; null where none of the kind is on the rack for it. */
  tool: tool.nullable(),
  /** The number of one that is on order, where none is here. */
  onOrder: z.string().nullable(),
  enough: z.boolean(),
  enoughInAll: z.boolean(),
  /** It is worn out in the middle of this run, after so many strikes. */
  replacedAfter: z.int().nullable(),
  /** What a new one would cost: of a plate by the list of metals, of a die what the last one cost. */
  newCost: z.string().nullable(),
  /** All of it in a sentence. */
  sentence: z.string(),
});
export type ToolForRun = z.infer<typeof toolForRun>;

/** Plates of one metal to buy, after the one that is there is worn out. */
const bought = z.object({
  plates: z.int(),
  cost: z.string(),
  /** How often a worn plate is changed for the next while it goes on. */
  changes: z.int(),
  /** The first of these changes, in impressions. */
  firstChangeAfter: z.int().nullable(),
});

const chosen = z.object({ metal: z.string(), cost: z.string(), plates: z.int() }).nullable();

const metalAdvice = z.object({
  /** What the plate that is there has left. */
  left: z.int(),
  impressions: z.int(),
  impressionsInAll: z.int(),
  rows: z.array(
    z.object({
      metal: z.string(),
      price: z.string(),
      lifeUses: z.int(),
      now: bought,
      inAll: bought,
    }),
  ),
  /** Null where nothing need be bought, or no metal is on the list. */
  leastNow: chosen,
  leastInAll: chosen,
  /** From how many impressions on, the plate that is there included, the dearer metal costs less. */
  turns: z.array(z.object({ cheap: z.string(), dear: z.string(), from: z.int().nullable() })),
});
export type MetalAdviceReply = z.infer<typeof metalAdvice>;

export const toolingAdvice = z
  .object({
    pieces: z.int(),
    runs: z.int(),
    runPieces: z.int(),
    tools: z.array(toolForRun),
    /** Null where the pattern needs no plate. */
    metals: metalAdvice.nullable(),
  })
  .meta({ id: 'ToolingAdvice' });
export type ToolingAdviceReply = z.infer<typeof toolingAdvice>;

export const readToolingAdvice = endpoint({
  method: 'GET',
  path: '/patterns/{id}/tooling-advice',
  summary:
    'The die and plate there are for a run, whether they last, and which metal a new plate should be',
  access: ['owner'],
  params: idParams,
  query: z.strictObject({
    /** Whose plate it is; left out, only what is for nobody in particular counts. */
    customerId: z.coerce
      .number(customerSentence)
      .int(customerSentence)
      .positive(customerSentence)
      .optional(),
    /** To cut, rejects included. */
    pieces: pieces('Enter how many pieces are cut, from 1 to 100,000.'),
    /** Runs expected after this one. */
    runs: z.coerce
      .number(repeatsSentence)
      .int(repeatsSentence)
      .min(0, repeatsSentence)
      .max(100, repeatsSentence)
      .default(0),
    /** Pieces cut in each of them; as many as now, if left out. */
    runPieces: pieces(
      'Enter how many pieces each of these runs cuts, from 1 to 100,000.',
    ).optional(),
  }),
  reply: toolingAdvice,
});

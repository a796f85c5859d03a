import { z } from 'zod';
import {
  day,
  line,
  money,
  optionalLine,
  paragraph,
  percent,
  runQuantity,
  unitPrice,
} from './fields.ts';

const breaks = z
  .array(
    z.strictObject({
      quantity: runQuantity,
      /** The owner's own price each; null leaves the price that is worked out. */
      typedPrice: unitPrice.nullable().default(null),
    }),
    'Enter at least one quantity.',
  )
  .min(1, 'Enter at least one quantity.')
  .max(8, 'Keep it to 8 quantities.')
  .superRefine((rungs, context) => {
    const seen = new Set<number>();
    rungs.forEach(({ quantity }, at) => {
      if (seen.has(quantity)) {
        context.addIssue({
          code: 'custom',
          path: [at, 'quantity'],
          message: `${quantity} is there already. Enter each quantity once.`,
        });
      }
      seen.add(quantity);
    });
  });

const tooling = z
  .array(
    z.strictObject({
      name: line(80, 'Say which tool, such as Stamp plate.'),
      /** What the shop pays for it. */
      cost: money,
      /** What the customer pays for it, as a line of its own. */
      charge: money,
    }),
  )
  .max(8, 'Keep it to 8 tools.');

/** What a person says about a quote; everything else is worked out from the pattern and the shop's values. */
export const quoteBody = z
  .strictObject({
    customerId: z.int('Choose a customer.').positive('Choose a customer.'),
    patternId: z.int('Choose a pattern.').positive('Choose a pattern.'),
    /** What the customer calls it; the pattern's name where it is empty. */
    title: optionalLine(80).default(''),
    inHandsOn: day.nullable().default(null),
    breaks,
    tooling: tooling.default([]),
    message: paragraph(2000).default(''),
    overrides: z
      .strictObject({
        rejectPercent: percent.optional(),
        leatherPricePerFt2: unitPrice.optional(),
      })
      .default({}),
  })
  .meta({ id: 'QuoteBody' });
export type QuoteBody = z.output<typeof quoteBody>;

import { z } from 'zod';
import { priceRule } from './price-rule.ts';
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
      /** How this one is worked out, in place of the quote's own rule. */
      rule: priceRule.nullable().default(null),
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

const hurry = z
  .string('Enter a share such as 25 %.')
  .trim()
  .regex(/^(0|[1-9]\d{0,2})(\.\d{1,2})?$/, 'Enter a share such as 25 %.')
  .refine((text) => Number(text) <= 500, 'Enter at most 500 %.');

const difference = z
  .string('Enter an amount such as 0.60.')
  .trim()
  .regex(/^-?(0|[1-9]\d{0,6})(\.\d{1,4})?$/, 'Enter an amount such as 0.60, or -0.20 for less.');

/** What beside the pieces a quote is priced by; whatever is left empty is as the shop usually has it. */
export const quoteTerms = z
  .strictObject({
    priceRule: priceRule.nullable().default(null),
    floorPrice: unitPrice.nullable().default(null),
    setUpCharge: money.nullable().default(null),
    minimumOrder: money.nullable().default(null),
    /** Empty where nobody is in a hurry. */
    rushPercent: hurry.nullable().default(null),
    /** What the carrier asks, and what of it the customer pays. */
    carriageCost: money.nullable().default(null),
    carriageCharge: money.nullable().default(null),
    resalePrice: unitPrice.nullable().default(null),
    /** Options of the pattern that are offered; without a difference in price it is worked out. */
    options: z
      .array(
        z.strictObject({
          name: line(60, 'Name the option.'),
          typedExtra: difference.nullable().default(null),
        }),
      )
      .max(6, 'Offer at most 6 options.')
      .default([]),
  })
  .meta({ id: 'QuoteTerms' });
export type QuoteTerms = z.output<typeof quoteTerms>;

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
    terms: quoteTerms.prefault({}),
    overrides: z
      .strictObject({
        rejectPercent: percent.optional(),
        leatherPricePerFt2: unitPrice.optional(),
      })
      .default({}),
  })
  .meta({ id: 'QuoteBody' });
export type QuoteBody = z.output<typeof quoteBody>;

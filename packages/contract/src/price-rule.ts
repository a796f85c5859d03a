import { z } from 'zod';
import { unitPrice } from './fields.ts';

const share = (most: number, sentence: string) =>
  z
    .string(sentence)
    .trim()
    .regex(/^(0|[1-9]\d{0,4})(\.\d{1,2})?$/, sentence)
    .refine((text) => Number(text) < most, sentence);

/** How a price that nobody typed is worked out. The domain's PriceRule. */
export const priceRule = z
  .discriminatedUnion(
    'kind',
    [
      z.strictObject({ kind: z.literal('target') }),
      z.strictObject({
        kind: z.literal('margin'),
        percent: share(95, 'Enter a margin below 95 %, as a share of the price.'),
      }),
      z.strictObject({
        kind: z.literal('markup'),
        percent: share(10_000, 'Enter a markup such as 100 %, on top of the cost.'),
      }),
      z.strictObject({ kind: z.literal('fixed'), amount: unitPrice }),
    ],
    'Choose how the price is worked out.',
  )
  .meta({ id: 'PriceRule' });

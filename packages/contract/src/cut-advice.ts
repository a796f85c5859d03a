import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { id, idParams, lengthBetween, money, runQuantity } from './fields.ts';

const offered = z.strictObject({
  widthMm: lengthBetween('panel’s width', 1, 20_000),
  heightMm: lengthBetween('panel’s height', 1, 20_000),
  /** Of one panel; null to reckon it by the leather's price per area. */
  price: money.nullable(),
});

const row = z.object({
  kind: z.enum(['panel', 'strip', 'lot']),
  widthMm: z.string().nullable(),
  heightMm: z.string().nullable(),
  lotId: id.nullable(),
  tag: z.string().nullable(),
  /** Lots: cut for the press into strips no wider than this; null where it is left whole. */
  stripsMm: z.string().nullable(),
  /** From one panel or lot; of a strip from one repeat. */
  pieces: z.int(),
  /** Reckoned from its area and usable share, since it is not drawn. */
  estimated: z.boolean(),
  /** Strips: the arrangement repeats after so much. */
  repeatMm: z.string().nullable(),
  /** Strips: how long one of this width must be for the run. */
  lengthMm: z.string().nullable(),
  /** How many panels or lots the run needs; null where there are not enough. */
  needed: z.int().nullable(),
  /** Of all that must be bought or taken whole. */
  wholePrice: z.string().nullable(),
  /** The share of it for the leather that the run uses. */
  sharePrice: z.string().nullable(),
  perGoodPiece: z.string().nullable(),
  areaPerGoodMm2: z.string().nullable(),
  cheapest: z.boolean(),
  /** What is left of the last panel, as its largest usable rectangle. */
  offcut: z.object({ widthMm: z.string(), heightMm: z.string() }).nullable(),
});

export const cutAdvice = z
  .object({
    good: z.int(),
    cut: z.int(),
    rows: z.array(row),
    /** The lots to take, one where one is enough; null where the rack does not hold enough. */
    rack: z.array(z.object({ lotId: id, tag: z.string(), pieces: z.int() })).nullable(),
  })
  .meta({ id: 'CutAdvice' });
export type CutAdviceReply = z.infer<typeof cutAdvice>;

export const adviseCut = endpoint({
  method: 'POST',
  path: '/patterns/{id}/cut-advice',
  summary: 'What to cut a run from: panels on offer, strip widths, lots on the rack',
  access: ['owner'],
  params: idParams,
  body: z.strictObject({
    good: runQuantity,
    panels: z.array(offered).max(8, 'Compare at most 8 panels.'),
  }),
  reply: cutAdvice,
});

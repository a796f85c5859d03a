import { DomainError, InvalidInput, sideLimits, soundSide } from '@hidewright/domain';
import { z } from 'zod';
import { confidential } from './confidential.ts';
import { endpoint } from './endpoint.ts';
import {
  choice,
  id,
  idParams,
  lengthBetween,
  line,
  optionalLine,
  page,
  pageQuery,
  paperNumber,
  percent,
  version,
  weighed,
} from './fields.ts';
import { lie } from './layouts.ts';
import { photoPlace } from './lot-photos.ts';

/** The forms that leather comes in and becomes. */
export const lotForms = [
  'side',
  'hide',
  'back',
  'bend',
  'shoulder',
  'double shoulder',
  'belly',
  'panel',
  'strip',
  'offcut',
] as const;
export type LotForm = (typeof lotForms)[number];

const tag = line(30, 'Enter the tag, such as T-0012.');

/** Leather of a lot that is out with a supplier to be worked on. */
const outFor = z.object({
  service: z.string(),
  areaMm2: z.string(),
  supplierName: z.string(),
  purchaseOrderId: id,
  purchaseOrderNumber: paperNumber,
  becomesName: z.string(),
  expectedOn: z.string().nullable(),
});
export type OutFor = z.infer<typeof outFor>;

export const lot = z
  .object({
    id,
    tag: z.string(),
    leatherId: id,
    leatherName: z.string(),
    form: z.enum(lotForms),
    /** As measured when it came, all panels of a bundle together. */
    measuredAreaMm2: z.string(),
    pieces: z.int(),
    widthMm: z.string().nullable(),
    heightMm: z.string().nullable(),
    /** As this leather measured, which its kind gives only from and to. */
    weightOz: z.string().nullable(),
    cost: confidential(z.string()),
    grade: z.string(),
    shade: z.string(),
    place: z.string(),
    supplierLot: z.string(),
    receivedOn: z.string(),
    purchaseOrderId: id.nullable(),
    purchaseOrderNumber: z.string().nullable(),
    onHandAreaMm2: z.string(),
    reservedAreaMm2: z.string(),
    freeAreaMm2: z.string(),
    outFor: z.array(outFor),
    /** What is left of it, at cost. */
    valueOnHand: confidential(z.string()),
    version,
  })
  .meta({ id: 'Lot' });
export type Lot = z.infer<typeof lot>;

const everybody = ['owner', 'maker', 'bookkeeper'] as const;

export const listLots = endpoint({
  method: 'GET',
  path: '/lots',
  summary: 'The lots on the rack, newest first',
  access: everybody,
  query: pageQuery.extend({
    leatherId: z.coerce.number().int().positive().optional(),
    /** Lots that are used up stay in the list unless only those on the rack are asked for. */
    onRack: z.enum(['yes', 'no']).optional(),
    /** Only lots of which something is on the rack or out to be worked on. */
    ours: z.literal('yes').optional(),
  }),
  reply: page(lot),
});

export const readLot = endpoint({
  method: 'GET',
  path: '/lots/{id}',
  summary: 'One lot',
  access: everybody,
  params: idParams,
  reply: lot,
});

export const changeLot = endpoint({
  method: 'PATCH',
  path: '/lots/{id}',
  summary: 'Correct a lot’s tag, or say where it lies and how it looks',
  access: ['owner', 'maker'],
  edits: true,
  params: idParams,
  body: z
    .strictObject({
      tag,
      weightOz: weighed.nullable(),
      grade: optionalLine(30),
      shade: optionalLine(30),
      place: optionalLine(60),
      supplierLot: optionalLine(60),
    })
    .partial(),
  reply: lot,
});

const point = z.strictObject({ x: z.number(), y: z.number() });
const curve = (most: number) =>
  z.array(point).min(3, 'Draw at least three corners.').max(most, `Draw at most ${most} corners.`);

/** A lot's edge and flaws in mm, as drawn, and what share of it can be used where nothing is drawn. */
const drawing = {
  outline: curve(sideLimits.outlineCorners).nullable(),
  flaws: z
    .array(curve(sideLimits.flawCorners))
    .max(sideLimits.flaws, `Draw at most ${sideLimits.flaws} flaws; join small ones.`),
  usablePercent: percent.refine((text) => Number(text) >= 1, 'Enter 1 % or more.'),
};

const lotDrawing = z
  .object({ ...drawing, usablePercent: z.string(), photo: photoPlace.nullable(), version })
  .meta({ id: 'LotDrawing' });
export type LotDrawing = z.infer<typeof lotDrawing>;

export const readLotDrawing = endpoint({
  method: 'GET',
  path: '/lots/{id}/drawing',
  summary: 'The edge and flaws of a lot as drawn',
  access: ['owner', 'maker'],
  params: idParams,
  reply: lotDrawing,
});

export const drawLot = endpoint({
  method: 'PUT',
  path: '/lots/{id}/drawing',
  summary: 'Draw a lot’s edge and flaws, or say what share of it can be used',
  access: ['owner', 'maker'],
  edits: true,
  params: idParams,
  body: z
    .strictObject({
      ...drawing,
      /** Left out, it stays as it is; null takes it off. */
      photo: photoPlace.nullable().optional(),
    })
    .superRefine((drawn, context) => {
      if (context.issues.length > 0) return;
      if (drawn.outline === null && drawn.flaws.length === 0) return;
      if (drawn.outline === null) {
        context.addIssue({
          code: 'custom',
          path: ['outline'],
          message: 'Draw the edge before the flaws.',
        });
        return;
      }
      try {
        soundSide({ outline: drawn.outline, flaws: drawn.flaws });
      } catch (error) {
        if (!(error instanceof DomainError)) throw error;
        const path = error instanceof InvalidInput ? error.field.split('.') : [];
        context.addIssue({ code: 'custom', path, message: error.message });
      }
    }),
  reply: lotDrawing,
});

/** How a pattern's pieces lie on a lot as it is drawn. */
export const lotLayout = z
  .object({
    ...lie,
    lotId: id,
    tag: z.string(),
    patternId: id,
    patternName: z.string(),
    outlinePath: z.string(),
    side: z.object({ outline: z.array(point), flaws: z.array(z.array(point)) }),
    /** The straight cuts that part it into strips first; null where it is left whole. */
    cuts: z
      .object({
        along: z.enum(['width', 'height']),
        at: z.array(z.number()),
        strips: z.array(
          z.object({ widthMm: z.number(), lengthMm: z.number(), pieces: z.int().min(0) }),
        ),
      })
      .nullable()
      .default(null),
  })
  .meta({ id: 'LotLayout' });
export type LotLayout = z.infer<typeof lotLayout>;

export const layOnLot = endpoint({
  method: 'POST',
  path: '/lots/{id}/layouts',
  summary: 'Work out how many pieces of a pattern a drawn lot gives',
  access: ['owner', 'maker'],
  creates: true,
  params: idParams,
  body: z.strictObject({
    patternId: choice('Choose a pattern.'),
    search: z.enum(['rows', 'best', 'strips'], 'Choose rows, best or strips.').default('rows'),
    /** Of strips: how wide one may be. What the widest press in use takes where it is not said. */
    widestMm: lengthBetween('widest strip', 20, 5000).optional(),
  }),
  reply: lotLayout,
});

import { z } from 'zod';
import { DomainError, InvalidInput, checkOutline } from '@hidewright/domain';
import { endpoint } from './endpoint.ts';
import { id, idParams, lengthBetween, positiveCount } from './fields.ts';
import { outlineOf } from './layout-asked.ts';

const side = (word: string) => lengthBetween(word, 1, 5000);
const cornerRadiusMm = lengthBetween('corner radius', 0, 2500);

/** A place in a drawing, in mm; geometry is in numbers, to a micrometre. */
const place = z.number('Give every corner as x and y in mm.').min(-10_000).max(10_000);
const corners = z
  .array(
    z.strictObject({ x: place, y: place }),
    'Choose a drawing, and which of its curves is cut.',
  )
  .min(3, 'Draw the outline with at least three corners.')
  .max(3000, 'Simplify the drawing: at most 3,000 corners can be kept.');
const holes = z
  .array(corners, 'Give the holes as closed curves.')
  .max(200, 'Keep at most 200 holes.');

/** The closed curve that the cutting die cuts: as its measures were typed, or as it was drawn. */
export const outline = z
  .discriminatedUnion(
    'shape',
    [
      z.strictObject({ shape: z.literal('round'), diameterMm: side('diameter') }),
      z.strictObject({
        shape: z.literal('rectangle'),
        widthMm: side('width'),
        heightMm: side('height'),
        cornerRadiusMm,
      }),
      z.strictObject({
        shape: z.literal('oval'),
        widthMm: side('width'),
        heightMm: side('height'),
      }),
      z.strictObject({
        shape: z.literal('tag'),
        lengthMm: side('length'),
        widthMm: side('width'),
        neckLengthMm: side('neck length'),
        neckWidthMm: side('neck width'),
        cornerRadiusMm,
      }),
      z.strictObject({
        shape: z.literal('polygon'),
        points: corners,
        /** Holes and slots inside it that the die punches as well. */
        punched: holes.optional(),
      }),
    ],
    'Choose round, rectangle, oval, tag or a drawing.',
  )
  .superRefine((typed, context) => {
    if (context.issues.length > 0) return;
    try {
      checkOutline(outlineOf(typed));
    } catch (error) {
      if (!(error instanceof DomainError)) throw error;
      const path = error instanceof InvalidInput ? [error.field] : [];
      context.addIssue({ code: 'custom', path, message: error.message });
    }
  });
export type TypedOutline = z.infer<typeof outline>;

const containerSide = (word: string) => lengthBetween(word, 1, 20_000);

/** What is cut from. */
export const container = z.discriminatedUnion(
  'form',
  [
    z.strictObject({
      form: z.literal('panel'),
      widthMm: containerSide('panel’s width'),
      heightMm: containerSide('panel’s height'),
    }),
    z.strictObject({
      form: z.literal('strip'),
      widthMm: containerSide('strip’s width'),
      lengthMm: containerSide('strip’s length'),
    }),
  ],
  'Choose panel or strip.',
);
export type TypedContainer = z.infer<typeof container>;

/** "I get 21 from 11 × 13 in". */
export const handCount = z.strictObject({
  pieces: positiveCount.max(20_000, 'Enter at most 20,000 pieces.'),
  widthMm: containerSide('panel’s width'),
  heightMm: containerSide('panel’s height'),
});
export type TypedHandCount = z.infer<typeof handCount>;

/** The part of a pattern that says how many pieces leather gives. */
export const layoutFields = {
  /** What drives the layout: the outline in rows, the outline as best found anyhow, or a hand count. */
  layoutBy: z.enum(
    ['outline', 'best found', 'hand count'],
    'Choose outline, best found or hand count.',
  ),
  outline: outline.nullable(),
  handCount: handCount.nullable(),
  /** The panel or strip that the outline is laid on; a hand count brings its own panel. */
  container: container.nullable(),
  /** How a piece may be turned against the spine, which runs along the panel's width or the strip. */
  turns: z
    .enum(['with the spine', 'quarter turns', 'free'], 'Choose how pieces may be turned.')
    .default('quarter turns'),
  /** The least distance between two cuts. */
  spacingMm: lengthBetween('spacing', 0, 100),
  /** The border of a panel or strip that stays unused. */
  trimMm: lengthBetween('trim', 0, 100),
};

type LayoutFields = z.infer<z.ZodObject<typeof layoutFields>>;

/** Whichever drives the layout must be there. */
export function refineLayoutFields(
  asked: LayoutFields,
  context: Pick<z.RefinementCtx, 'addIssue'>,
): void {
  const refuse = (field: keyof LayoutFields, message: string) =>
    context.addIssue({ code: 'custom', path: [field], message });
  if (asked.layoutBy === 'hand count') {
    if (asked.handCount === null)
      refuse('handCount', 'Enter how many pieces a panel gives, and its size.');
    return;
  }
  if (asked.outline === null) refuse('outline', 'Draw the outline, or choose a hand count.');
  if (asked.container === null)
    refuse('container', 'Choose the panel or strip that the pieces are cut from.');
}

export const layoutAsked = z.strictObject(layoutFields).superRefine(refineLayoutFields);
export type LayoutAsked = z.infer<typeof layoutAsked>;

const mm = z.number();
const laidContainer = z.discriminatedUnion('form', [
  z.object({ form: z.literal('panel'), widthMm: mm, heightMm: mm }),
  z.object({ form: z.literal('strip'), widthMm: mm, lengthMm: mm.optional() }),
]);

/** How pieces lie on whatever they are cut from; geometry is in numbers, areas are exact text. */
export const lie = {
  by: z.enum(['rows', 'best found', 'hand count']),
  pieces: z.int().min(0),
  placements: z.array(z.object({ x: mm, y: mm, rot: mm })),
  pitchMm: mm.nullable(),
  rowStepMm: mm.nullable(),
  shiftMm: mm.nullable(),
  rows: z.int().nullable(),
  piecesPerRow: z.int().nullable(),
  rowPieces: z.array(z.int()).nullable().default(null),
  turned: z.enum(['none', 'every other row', 'every other piece']),
  containerAreaMm2: z.string(),
  pieceAreaMm2: z.string().nullable(),
  yieldPercent: z.string().nullable(),
  areaPerPieceMm2: z.string().nullable(),
  // Layouts that were kept before these were reckoned have none of them.
  wasteBetweenPercent: z.string().nullable().default(null),
  edgeWastePercent: z.string().nullable().default(null),
  offcut: z.object({ x: mm, y: mm, widthMm: mm, heightMm: mm }).nullable().default(null),
  boundPieces: z.int().nullable(),
  piecesInRows: z.int().nullable().default(null),
};

/** How the pieces lie on a panel or strip, as the domain works it out. */
export const layout = z
  .object({
    ...lie,
    container: laidContainer,
    mmPerPiece: mm.nullable(),
    period: z.object({ mm, pieces: z.int() }).nullable(),
  })
  .meta({ id: 'Layout' });
export type LayoutReply = z.infer<typeof layout>;

/** A layout that was worked out and is kept: the same input always finds the same one. */
export const storedLayout = z
  .object({
    id,
    layout,
    /** The outline as SVG path data in mm, which each placement turns and moves; none for a hand count. */
    outlinePath: z.string().nullable(),
  })
  .meta({ id: 'StoredLayout' });
export type StoredLayoutReply = z.infer<typeof storedLayout>;

export const workOutLayout = endpoint({
  method: 'POST',
  path: '/layouts',
  summary: 'Work out how many pieces a panel or strip gives, and keep it',
  access: ['owner'],
  creates: true,
  body: layoutAsked,
  reply: storedLayout,
});

export const readLayout = endpoint({
  method: 'GET',
  path: '/layouts/{id}',
  summary: 'A layout that was worked out',
  access: ['owner', 'maker'],
  params: idParams,
  reply: storedLayout,
});

import { z } from 'zod';
import { hardwarePers, hardwareUnits } from '@hidewright/domain';
import { endpoint } from './endpoint.ts';
import { confidential } from './confidential.ts';
import {
  id,
  idParams,
  instant,
  line,
  page,
  pageQuery,
  percent,
  positiveCount,
  unitPrice,
  version,
} from './fields.ts';
import { layout, layoutFields, refineLayoutFields } from './layouts.ts';
import { onceSound } from './once-sound.ts';
import { refineOptions, refineSteps } from './pattern-rules.ts';
import { workPlan } from './work-plan.ts';

const perPiece = positiveCount.max(10_000, 'Enter at most 10,000.');
const per = z.enum(hardwarePers, 'Choose what it is counted per.');
/** Needed for every piece that reaches this step, counted from 0; else for the pieces ordered. */
const fromStep = z.int('Choose a step.').min(0).max(39).nullish();

const hardwareLine = z.strictObject({
  hardwareId: id,
  /** Whole units for each piece, or for what `per` says. */
  perPiece,
  /** For each piece, where nobody said. */
  per: per.optional(),
  fromStep,
  /** Layers of leather that it is set through; two where nobody said. */
  layers: z
    .int('Enter whole layers.')
    .min(1, 'Enter 1 layer or more.')
    .max(20, 'Enter at most 20 layers.')
    .nullish(),
  /** Of the hardware itself that is spoiled. */
  lossPercent: percent
    .refine((text) => Number(text) <= 99, 'Enter losses from 0 to 99 %.')
    .optional(),
});

const supplyLine = z.strictObject({
  name: line(60, 'Enter what is used up, such as edge dye.'),
  /** What it costs for each piece, for 100 pieces, or for the run. */
  cost: confidential(unitPrice),
  per,
});

/** The same piece with other hardware, for the customer to choose. */
const patternOption = z.strictObject({
  name: line(60, 'Name the option, such as With a brass ring.'),
  swaps: z
    .array(
      z.strictObject({
        /** What is left out; nothing where something is added. */
        hardwareId: id.nullable(),
        /** What comes in its place; nothing where it is only left out. */
        byHardwareId: id.nullable(),
        perPiece,
        /** Of what is added; what comes in a line's place is needed from the same step on. */
        fromStep,
      }),
    )
    .min(1, 'Say what is different.')
    .max(10, 'Keep it to 10 changes.'),
});

/** Pieces that past runs counted; the cut count is reckoned with them. */
const history = z
  .strictObject({ good: positiveCount, total: positiveCount })
  .refine(({ good, total }) => good <= total, {
    path: ['good'],
    ...onceSound('No more pieces can be good than were made.'),
  });

/** What a pattern is: its outline or hand count, leather, hardware and work. Each change is a new version. */
export const patternDefinition = z
  .strictObject({
    ...layoutFields,
    leatherId: z.int('Choose a leather.').positive('Choose a leather.'),
    /** What runs take on top of the layout, for flaws and what is cut away around them. */
    leatherExtraPercent: percent
      .refine((text) => Number(text) <= 200, 'Enter at most 200 %.')
      .optional(),
    hardware: z.array(hardwareLine).max(40, 'Keep it to 40 lines of hardware.'),
    supplies: z.array(supplyLine).max(20, 'Keep it to 20 lines of supplies.').optional(),
    options: z.array(patternOption).max(6, 'Keep it to 6 options.').optional(),
    work: workPlan,
    needsDie: z.boolean(),
    needsPlate: z.boolean(),
    /** The pieces behind the rejects, where they were learned from past runs; null where they were entered. */
    history: history.nullable().default(null),
  })
  .superRefine((definition, context) => {
    refineLayoutFields(definition, context);
    refineSteps(definition, context);
    refineOptions(definition, context);
    definition.hardware.forEach(({ hardwareId }, at) => {
      if (definition.hardware.findIndex((each) => each.hardwareId === hardwareId) === at) return;
      context.addIssue({
        code: 'custom',
        path: ['hardware', at, 'hardwareId'],
        message: 'This is listed already. Enter all of it on one line.',
      });
    });
  })
  .meta({ id: 'PatternDefinition' });
export type PatternDefinition = z.infer<typeof patternDefinition>;

const patternVersion = z.object({
  number: z.int().positive(),
  definition: patternDefinition,
  createdAt: instant,
  createdBy: z.string(),
});

/** A pattern as it is now, with the names that its definition points to. */
export const pattern = z
  .object({
    id,
    name: z.string(),
    active: z.boolean(),
    /** Which version of the definition this is; quotes keep theirs. */
    versionNumber: z.int().positive(),
    definition: patternDefinition,
    leatherName: z.string(),
    hardware: z.array(
      z.object({
        hardwareId: id,
        name: z.string(),
        unit: z.enum(hardwareUnits),
        perPiece: z.int(),
        per,
        /** What speaks against setting it through this leather, in sentences. */
        remarks: z.array(z.string()),
      }),
    ),
    /** "round, 95 mm" or "21 from a panel". */
    description: z.string(),
    /** SVG path data in mm; none where the pattern has no drawing. */
    outlinePath: z.string().nullable(),
    layout,
    changedAt: instant,
    changedBy: z.string(),
    version,
  })
  .meta({ id: 'Pattern' });
export type Pattern = z.infer<typeof pattern>;

export const patternSummary = z.object({
  id,
  name: z.string(),
  active: z.boolean(),
  versionNumber: z.int().positive(),
  description: z.string(),
  leatherName: z.string(),
  outlinePath: z.string().nullable(),
  /** Pieces from one panel or strip; unknown until the layout is worked out again. */
  pieces: z.int().nullable(),
  yieldPercent: z.string().nullable(),
  form: z.enum(['panel', 'strip']),
  changedAt: instant,
});
export type PatternSummary = z.infer<typeof patternSummary>;

const name = line(80, 'Enter a name, such as Round coaster.');
const readers = ['owner', 'maker'] as const;

export const listPatterns = endpoint({
  method: 'GET',
  path: '/patterns',
  summary: 'What the shop makes',
  access: readers,
  query: pageQuery.extend({ active: z.enum(['yes', 'no']).optional() }),
  reply: page(patternSummary),
});

export const readPattern = endpoint({
  method: 'GET',
  path: '/patterns/{id}',
  summary: 'A pattern as it is now',
  access: readers,
  params: idParams,
  reply: pattern,
});

export const listPatternVersions = endpoint({
  method: 'GET',
  path: '/patterns/{id}/versions',
  summary: 'How a pattern was designed before, newest first',
  access: readers,
  params: idParams,
  reply: z.object({ items: z.array(patternVersion) }),
});

const templateQuery = z.strictObject({
  /** How far artwork is to stay from every cut. */
  safeMarginMm: z.coerce
    .number('Enter the safe margin in mm, such as 3.')
    .min(0.1, 'Enter a safe margin of at least 0.1 mm.')
    .max(100, 'Enter a safe margin of at most 100 mm.')
    .default(3),
});

export const patternTemplateSvg = endpoint({
  method: 'GET',
  path: '/patterns/{id}/template.svg',
  summary: 'The outline true to size, for the customer’s artwork',
  access: readers,
  params: idParams,
  query: templateQuery,
  reply: z.unknown(),
  file: 'image/svg+xml',
});

export const patternTemplatePdf = endpoint({
  method: 'GET',
  path: '/patterns/{id}/template.pdf',
  summary: 'The outline true to size, to print, with a line to check the print by',
  access: readers,
  params: idParams,
  query: templateQuery,
  reply: z.unknown(),
  file: 'application/pdf',
});

export const patternLayoutPdf = endpoint({
  method: 'GET',
  path: '/patterns/{id}/layout.pdf',
  summary: 'How the pieces lie, to print and hang beside the press',
  access: readers,
  params: idParams,
  reply: z.unknown(),
  file: 'application/pdf',
});

export const addPattern = endpoint({
  method: 'POST',
  path: '/patterns',
  summary: 'Add a pattern',
  access: ['owner'],
  creates: true,
  body: z.strictObject({ name, definition: patternDefinition }),
  reply: pattern,
});

export const changePattern = endpoint({
  method: 'PATCH',
  path: '/patterns/{id}',
  summary: 'Change a pattern; another definition becomes a new version',
  access: ['owner'],
  edits: true,
  params: idParams,
  body: z.strictObject({ name, definition: patternDefinition, active: z.boolean() }).partial(),
  reply: pattern,
});

import { z } from 'zod';
import { confidential } from './confidential.ts';
import { endpoint } from './endpoint.ts';
import {
  areaMm2,
  day,
  id,
  idParams,
  instant,
  lengthBetween,
  line,
  money,
  optionalLine,
  page,
  pageQuery,
  positiveCount,
  version,
} from './fields.ts';

export const toolKinds = ['cutting die', 'stamp plate'] as const;
export const toolStates = ['on the rack', 'on order', 'returned', 'scrapped'] as const;
export const toolOwners = ['shop', 'customer'] as const;
export const plateMetals = ['steel', 'magnesium', 'copper', 'brass'] as const;

const kind = z.enum(toolKinds, 'Choose cutting die or stamp plate.');
const state = z.enum(toolStates, 'Choose on the rack or on order.');
const metal = z.enum(['', ...plateMetals], 'Choose magnesium, copper, brass or steel.');

const lifeSentence = 'Enter how many cuts or impressions it lasts, 1 or more.';

const fewMm = (word: string) => lengthBetween(word, 0, 20).nullable();

/** What meets the press: a die's rule and how many pieces it cuts at once, a plate's border and relief. */
const atThePress = {
  piecesPerStrike: positiveCount.max(100, 'Enter at most 100 pieces.'),
  ruleThicknessMm: fewMm('thickness of the rule'),
  borderMm: fewMm('border of the plate'),
  reliefAreaMm2: areaMm2.nullable(),
};

const typed = {
  name: line(80, 'Enter a name, such as Coaster 95 mm.'),
  metal,
  cost: money,
  /** How many cuts or impressions it is good for. */
  lifeUses: z
    .int(lifeSentence)
    .min(1, lifeSentence)
    .max(10_000_000, 'Enter a life of at most 10,000,000.'),
  slot: optionalLine(40),
  patternId: id.nullable(),
  customerId: id.nullable(),
  /** The shop's, or the customer's own: then it is kept for a term and given back or scrapped. */
  ownedBy: z.enum(toolOwners, 'Choose the shop’s own or the customer’s own.'),
  /** The last day of that term; null where none is agreed, and for the shop's own. */
  keptUntil: day.nullable(),
  state,
  ...atThePress,
};

export const tool = z
  .object({
    id,
    /** As people call it: die 7, plate 41. */
    number: z.string(),
    kind,
    name: z.string(),
    metal,
    cost: confidential(z.string()),
    lifeUses: z.int(),
    /** Cuts or impressions so far. */
    used: z.int(),
    /** None left where it has outlived what was expected. */
    usesLeft: z.int().min(0),
    slot: z.string(),
    patternId: id.nullable(),
    patternName: z.string().nullable(),
    customerId: id.nullable(),
    customerName: z.string().nullable(),
    ownedBy: z.enum(toolOwners),
    keptUntil: day.nullable(),
    /** The customer's own, still here, and its last day has come: give it back or scrap it. */
    termOver: z.boolean(),
    state,
    piecesPerStrike: z.int(),
    ruleThicknessMm: z.string().nullable(),
    borderMm: z.string().nullable(),
    reliefAreaMm2: z.string().nullable(),
    version,
  })
  .meta({ id: 'Tool' });
export type ToolReply = z.infer<typeof tool>;

export const impression = z.object({
  id,
  uses: z.int(),
  jobId: id.nullable(),
  jobNumber: z.string().nullable(),
  at: instant,
  reason: z.string(),
  actorName: z.string(),
});
export type ImpressionReply = z.infer<typeof impression>;

const readers = ['owner', 'maker'] as const;

export const listTools = endpoint({
  method: 'GET',
  path: '/tools',
  summary: 'Cutting dies and stamp plates',
  access: readers,
  query: pageQuery.extend({
    kind: kind.optional(),
    state: state.optional(),
    patternId: z.coerce.number().int().positive().optional(),
  }),
  reply: page(tool),
});

export const readTool = endpoint({
  method: 'GET',
  path: '/tools/{id}',
  summary: 'One cutting die or stamp plate',
  access: readers,
  params: idParams,
  reply: tool,
});

export const addTool = endpoint({
  method: 'POST',
  path: '/tools',
  summary: 'Add a cutting die or stamp plate; without a number it gets the next one of its kind',
  access: ['owner'],
  creates: true,
  body: z.strictObject({
    ...typed,
    kind,
    number: optionalLine(12).default(''),
    metal: metal.default(''),
    slot: typed.slot.default(''),
    patternId: typed.patternId.default(null),
    customerId: typed.customerId.default(null),
    ownedBy: typed.ownedBy.default('shop'),
    keptUntil: typed.keptUntil.default(null),
    state: state.default('on the rack'),
    piecesPerStrike: atThePress.piecesPerStrike.default(1),
    ruleThicknessMm: atThePress.ruleThicknessMm.default(null),
    borderMm: atThePress.borderMm.default(null),
    reliefAreaMm2: atThePress.reliefAreaMm2.default(null),
  }),
  reply: tool,
});

export const changeTool = endpoint({
  method: 'PATCH',
  path: '/tools/{id}',
  summary: 'Change a cutting die or stamp plate',
  access: ['owner'],
  edits: true,
  params: idParams,
  body: z.strictObject({ ...typed, number: line(12, 'Enter the number it goes by.') }).partial(),
  reply: tool,
});

export const giveBackTool = endpoint({
  method: 'POST',
  path: '/tools/{id}/returns',
  summary: 'Give a customer’s own cutting die or stamp plate back',
  access: ['owner'],
  creates: true,
  params: idParams,
  body: z.strictObject({}),
  reply: tool,
});

export const scrapTool = endpoint({
  method: 'POST',
  path: '/tools/{id}/scrappings',
  summary: 'Scrap a cutting die or stamp plate: no job is given it any more',
  access: ['owner'],
  creates: true,
  params: idParams,
  body: z.strictObject({}),
  reply: tool,
});

export const listImpressions = endpoint({
  method: 'GET',
  path: '/tools/{id}/impressions',
  summary: 'What a cutting die or stamp plate did, newest first',
  access: readers,
  params: idParams,
  query: pageQuery.omit({ q: true }),
  reply: page(impression),
});

export const addImpressions = endpoint({
  method: 'POST',
  path: '/tools/{id}/impressions',
  summary: 'Count cuts or impressions made outside a job, or correct the count',
  access: readers,
  creates: true,
  params: idParams,
  body: z.strictObject({
    /** Below zero for a correction. */
    uses: z
      .int('Enter a whole number.')
      .min(-10_000_000, 'That is too many.')
      .max(10_000_000, 'That is too many.')
      .refine((uses) => uses !== 0, 'Enter how many, but not 0.'),
    reason: line(120, 'Enter why, such as trial strikes.'),
  }),
  reply: tool,
});

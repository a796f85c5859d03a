import {
  addPattern,
  type Pattern,
  type PatternDefinition,
  type Workshop,
} from '@hidewright/contract';
import { z } from 'zod';
import { filled, pick } from './filled.ts';
import { hardwareBody, partsBody } from './typed-parts.ts';
import { blankWork, stepCount, typedWork, workBody } from './typed-work.ts';

/** What a form holds: every measure of every shape, so that going from one to another and back loses nothing. */
type Typed = Record<string, unknown>;

const outlineMeasures: Record<string, readonly string[]> = {
  round: ['diameterMm'],
  rectangle: ['widthMm', 'heightMm', 'cornerRadiusMm'],
  oval: ['widthMm', 'heightMm'],
  tag: ['lengthMm', 'widthMm', 'neckLengthMm', 'neckWidthMm', 'cornerRadiusMm'],
  polygon: ['points', 'punched'],
};
const containerMeasures: Record<string, readonly string[]> = {
  panel: ['widthMm', 'heightMm'],
  strip: ['widthMm', 'lengthMm'],
};
const blankDefinition = {
  layoutBy: 'outline',
  alsoDrawn: false,
  outline: {
    shape: 'round',
    diameterMm: '',
    widthMm: '',
    heightMm: '',
    cornerRadiusMm: '0',
    lengthMm: '',
    neckLengthMm: '',
    neckWidthMm: '',
    // Said about a drawing, and not sent: what comes of it is in `points` and `punched`.
    curve: '',
    kept: {},
    knownWidthMm: '',
  },
  handCount: { pieces: '', widthMm: '', heightMm: '' },
  container: { form: 'panel', widthMm: '', heightMm: '', lengthMm: '' },
  turns: 'quarter turns',
  spacingMm: '',
  trimMm: '',
  leatherId: '',
  leatherExtraPercent: '',
  hardware: [],
  supplies: [],
  options: [],
  work: blankWork,
  needsDie: true,
  needsPlate: false,
  history: null,
};

/** A new pattern, with the shop's own starting values. */
export function blankPattern({ spacingMm, trimMm, rejectPercent }: Workshop): Typed {
  const work = { ...blankWork, rejectPercent };
  return { name: '', definition: { ...blankDefinition, spacingMm, trimMm, work } };
}

/** A pattern as the form takes it up again. */
export function typedPattern({ name, definition }: Pick<Pattern, 'name' | 'definition'>): Typed {
  const blank = blankDefinition;
  return {
    name,
    definition: {
      ...definition,
      leatherExtraPercent: definition.leatherExtraPercent ?? '',
      alsoDrawn: definition.layoutBy === 'hand count' && definition.outline !== null,
      outline: { ...blank.outline, ...definition.outline },
      handCount: { ...blank.handCount, ...definition.handCount },
      container: { ...blank.container, ...definition.container },
      hardware: definition.hardware.map((line) => ({ ...line, per: line.per ?? 'piece' })),
      supplies: definition.supplies ?? [],
      options: definition.options ?? [],
      work: typedWork(definition.work),
    },
  };
}

/** What the contract is sent: of all that the form holds, what the chosen shape, panel and way of working need. */
export function patternBody(typed: unknown): { name: unknown; definition: Typed } {
  const { name, definition } = typed as { name: unknown; definition: Typed };
  return { name, definition: { ...definitionBody(definition) } };
}

/** The part of the body that says how the pieces lie. */
export function layoutBody(definition: Typed): Typed {
  const byHand = definition['layoutBy'] === 'hand count';
  const drawn = !byHand || definition['alsoDrawn'] === true;
  return {
    layoutBy: definition['layoutBy'],
    outline: drawn ? chosen(definition['outline'], 'shape', outlineMeasures) : null,
    handCount: byHand ? definition['handCount'] : null,
    container: byHand ? null : chosen(definition['container'], 'form', containerMeasures),
    turns: definition['turns'],
    spacingMm: definition['spacingMm'],
    trimMm: definition['trimMm'],
  };
}

function definitionBody(definition: Typed): Typed {
  const work = definition['work'] as Typed;
  const hardware = definition['hardware'] as Typed[];
  const steps = stepCount(work);
  return {
    ...layoutBody(definition),
    leatherId: definition['leatherId'],
    ...filled(pick(definition, ['leatherExtraPercent'])),
    hardware: hardware.map((line) => hardwareBody(line, steps)),
    ...partsBody(definition, steps),
    work: workBody(work),
    needsDie: definition['needsDie'],
    needsPlate: definition['needsPlate'],
    history: definition['history'] ?? null,
  };
}

function chosen(value: unknown, by: string, measures: Record<string, readonly string[]>): Typed {
  const typed = (value ?? {}) as Typed;
  const names = measures[String(typed[by])] ?? [];
  return Object.fromEntries([by, ...names].map((name) => [name, typed[name]]));
}

/** The contract's own schema, asked of what the form would send: its sentences land beside the same fields. */
export const patternForm = z.preprocess(
  patternBody,
  addPattern.body as z.ZodType,
) as unknown as z.ZodType<Typed, Typed>;

/** What is sent, after the form's schema has found nothing to say. */
export function sentPattern(typed: unknown): { name: string; definition: PatternDefinition } {
  return patternBody(typed) as unknown as { name: string; definition: PatternDefinition };
}

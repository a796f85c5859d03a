import type { PatternDefinition, Workshop } from '@hidewright/contract';
import { describe, expect, it } from 'vitest';
import { afterMove, afterRemoval, blankSwap, linesThatWait } from './typed-parts.ts';
import { blankPattern, patternBody, patternForm, typedPattern } from './typed-pattern.ts';

const startingValues = { spacingMm: '2', trimMm: '3', rejectPercent: '10' } as Workshop;

const tag: PatternDefinition = {
  layoutBy: 'outline',
  outline: {
    shape: 'tag',
    lengthMm: '110',
    widthMm: '60',
    neckLengthMm: '35',
    neckWidthMm: '22',
    cornerRadiusMm: '8',
  },
  handCount: null,
  container: { form: 'strip', widthMm: '130', lengthMm: '1200' },
  turns: 'with the spine',
  spacingMm: '2',
  trimMm: '3',
  leatherId: 1,
  hardware: [{ hardwareId: 2, perPiece: 1 }],
  work: {
    kind: 'steps',
    steps: [
      { name: 'Cut', setupMinutes: '5', secondsPerUnit: '12', per: 'piece', rejectPercent: '2' },
    ],
  },
  needsDie: true,
  needsPlate: false,
  history: null,
};

/** All that can be said about a pattern beside what it must have. */
const full: PatternDefinition = {
  ...tag,
  hardware: [
    { hardwareId: 2, perPiece: 1, fromStep: 1, lossPercent: '3' },
    { hardwareId: 3, perPiece: 2 },
    { hardwareId: 6, perPiece: 45, per: 'hundred' },
  ],
  supplies: [{ name: 'Edge dye', cost: '1.8', per: 'hundred' }],
  options: [
    {
      name: 'With a brass ring',
      swaps: [
        { hardwareId: 2, byHardwareId: 4, perPiece: 1 },
        { hardwareId: 3, byHardwareId: null, perPiece: 1 },
        { hardwareId: null, byHardwareId: 5, perPiece: 2, fromStep: 1 },
      ],
    },
  ],
  work: {
    kind: 'steps',
    secondsPercent: '2',
    learning: { model: 'cumulative', curvePercent: '90', measuredAt: 50 },
    steps: [
      {
        name: 'Case',
        setupMinutes: '6',
        secondsPerUnit: '40',
        per: 'panel',
        rejectPercent: '0',
        longestWait: '30',
      },
      {
        name: 'Cut',
        setupMinutes: '5',
        secondsPerUnit: '12',
        per: 'piece',
        rejectPercent: '2',
        people: 2,
        unattended: true,
        shortestWait: '60',
        pieceRate: '0.12',
      },
    ],
  },
  history: { good: 940, total: 1000 },
};

interface Typed {
  name: string;
  definition: Record<string, unknown> & { work: { steps: Record<string, unknown>[] } };
}

const typedFull = () =>
  structuredClone(typedPattern({ name: 'Tag', definition: full })) as never as Typed;

describe('a pattern in its form', () => {
  it('is sent as it came when nothing is typed', () => {
    const pattern = { name: 'Luggage tag', definition: tag };
    expect(patternBody(typedPattern(pattern))).toEqual(pattern);
  });

  it('is sent with the pieces of past runs behind its rejects', () => {
    const history = { good: 470, total: 500 };
    const pattern = { name: 'Luggage tag', definition: { ...tag, history } };
    expect(patternBody(typedPattern(pattern))).toEqual(pattern);
  });

  it('is sent with a hand count beside its drawing, and without the panel that would not hold', () => {
    const handCount = { pieces: 21, widthMm: '279.4', heightMm: '330.2' };
    const definition = { ...tag, layoutBy: 'hand count' as const, handCount, container: null };
    expect(patternBody(typedPattern({ name: 'Tag', definition })).definition).toEqual(definition);
  });

  it('is sent with a drawing’s corners and holes, and nothing of how they were chosen', () => {
    const points = [
      { x: 0, y: 0 },
      { x: 40, y: 0 },
      { x: 0, y: 30 },
    ];
    const outline = { shape: 'polygon' as const, points, punched: [points] };
    const pattern = { name: 'Drawn', definition: { ...tag, outline } };
    expect(patternBody(typedPattern(pattern))).toEqual(pattern);
  });

  it('forgets the measures of a shape that is no longer chosen, and the drawing that is no longer wanted', () => {
    const typed = typedPattern({ name: 'Tag', definition: tag }) as { definition: object };
    const outline = { shape: 'round', diameterMm: '95', neckWidthMm: '22' };
    const round = patternBody({ ...typed, definition: { ...typed.definition, outline } });
    expect(round.definition['outline']).toEqual({ shape: 'round', diameterMm: '95' });
    const byHand = { ...typed.definition, layoutBy: 'hand count', alsoDrawn: false };
    expect(patternBody({ ...typed, definition: byHand }).definition['outline']).toBeNull();
  });

  it('is told at the fields that are in sight what a new one lacks', () => {
    const parsed = patternForm.safeParse(blankPattern(startingValues));
    expect(parsed.error?.issues.map(({ path }) => path.join('.'))).toEqual([
      'name',
      'definition.outline.diameterMm',
      'definition.container.widthMm',
      'definition.container.heightMm',
      'definition.leatherId',
      'definition.work.minutes',
    ]);
  });

  it('is sent with all that is said about it as it came', () => {
    const { definition } = patternBody(typedFull());
    expect(JSON.parse(JSON.stringify(definition))).toEqual(full);
    expect(patternForm.safeParse(typedFull()).error?.issues).toBeUndefined();
  });

  it('leaves out what is left empty, so that it says no more than before', () => {
    const typed = structuredClone(typedPattern({ name: 'Tag', definition: tag })) as never as Typed;
    Object.assign(typed.definition['work'].steps[0] ?? {}, {
      people: undefined,
      unattended: false,
      shortestWait: '',
      pieceRate: undefined,
    });
    const { definition } = patternBody(typed);
    expect(Object.keys(definition)).not.toContain('supplies');
    expect(definition['work']).toStrictEqual(tag.work);
    expect(definition['hardware']).toStrictEqual(tag.hardware);
  });

  it('lets hardware wait for no step that is gone, and nothing be counted that is left out', () => {
    const typed = typedFull();
    typed.definition.work.steps.pop();
    const swaps = [
      { hardwareId: 3, byHardwareId: null, perPiece: '' },
      { hardwareId: '', byHardwareId: 5, perPiece: 1, fromStep: 1 },
      { hardwareId: 2, byHardwareId: 4, perPiece: 1, fromStep: 0 },
    ];
    typed.definition['options'] = [{ name: 'Without rivets', swaps }];
    const { definition } = patternBody(typed);
    expect(definition['hardware']).toEqual([
      { hardwareId: 2, perPiece: 1, lossPercent: '3' },
      { hardwareId: 3, perPiece: 2 },
      { hardwareId: 6, perPiece: 45, per: 'hundred' },
    ]);
    expect(definition['options']).toEqual([
      {
        name: 'Without rivets',
        swaps: [
          { hardwareId: 3, byHardwareId: null, perPiece: 1 },
          { hardwareId: null, byHardwareId: 5, perPiece: 1 },
          { hardwareId: 2, byHardwareId: 4, perPiece: 1 },
        ],
      },
    ]);
  });

  it('is told beside the field what an option or a supply lacks', () => {
    const typed = typedFull();
    typed.definition['supplies'] = [{ name: '', cost: '', per: 'hundred' }];
    typed.definition['options'] = [{ name: '', swaps: [blankSwap] }];
    const issues = patternForm.safeParse(typed).error?.issues ?? [];
    expect(issues.map(({ path }) => path.join('.'))).toEqual([
      'definition.supplies.0.name',
      'definition.supplies.0.cost',
      'definition.options.0.name',
      'definition.options.0.swaps.0.hardwareId',
    ]);
  });
});

describe('hardware that waits for a step', () => {
  it('goes with it when steps change places', () => {
    expect([0, 1, 2, 3].map((step) => afterMove(step, 0, 2))).toEqual([2, 0, 1, 3]);
    expect([0, 1, 2, 3].map((step) => afterMove(step, 3, 1))).toEqual([0, 2, 3, 1]);
  });

  it('is found among the pattern’s own and what its options add', () => {
    expect(linesThatWait({ ...full, hardware: full.hardware.slice(1) })).toEqual([
      'definition.hardware.0',
      'definition.hardware.1',
      'definition.options.0.swaps.0',
      'definition.options.0.swaps.1',
      'definition.options.0.swaps.2',
    ]);
    expect(linesThatWait({ hardware: [] })).toEqual([]);
  });

  it('waits for none once its step is gone', () => {
    expect([0, 1, 2].map((step) => afterRemoval(step, 1))).toEqual([0, undefined, 1]);
  });
});

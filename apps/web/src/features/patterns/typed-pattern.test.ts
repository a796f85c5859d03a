import type { PatternDefinition, Workshop } from '@hidewright/contract';
import { describe, expect, it } from 'vitest';
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
});

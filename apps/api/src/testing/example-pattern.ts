import type { PatternDefinition } from '@hidewright/contract';

/** A round coaster of 95 mm on a panel of 11 × 13 in, for the tests. */
export function coaster(
  leatherId: number,
  change: Partial<PatternDefinition> = {},
): PatternDefinition {
  return {
    layoutBy: 'outline',
    outline: { shape: 'round', diameterMm: '95' },
    handCount: null,
    container: { form: 'panel', widthMm: '279.4', heightMm: '330.2' },
    turns: 'quarter turns',
    spacingMm: '2',
    trimMm: '3',
    leatherId,
    hardware: [],
    work: { kind: 'minutesPer100', minutes: '180', rejectPercent: '10' },
    needsDie: true,
    needsPlate: true,
    history: null,
    ...change,
  };
}

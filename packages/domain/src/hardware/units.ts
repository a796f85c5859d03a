import { countWords } from '../numbers/count-words.ts';

/** What one of some hardware or supplies is. All are counted whole. */
export const hardwareUnits = [
  'piece',
  'pair',
  'set',
  'm',
  'ml',
  'g',
  'sheet',
  'roll',
  'bottle',
] as const;
export type HardwareUnit = (typeof hardwareUnits)[number];

const symbols: readonly HardwareUnit[] = ['m', 'ml', 'g'];

/** What one of it is called, or several: pair, pairs; ml and ml. */
export const unitWord = (unit: HardwareUnit, count: number | string = 1): string =>
  symbols.includes(unit) || Number(count) === 1 ? unit : `${unit}s`;

/** "12 pairs"; pieces are not named, since that is what everybody counts. */
export const countedWords = (count: number | string, unit: HardwareUnit): string =>
  unit === 'piece' ? countWords(count) : `${countWords(count)} ${unitWord(unit, count)}`;

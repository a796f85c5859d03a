import type { HardwareUnit } from '@hidewright/contract';
import { countText } from '../../lib/formatting.ts';

const words: Record<HardwareUnit, readonly [one: string, many: string]> = {
  piece: ['piece', 'pieces'],
  pair: ['pair', 'pairs'],
  set: ['set', 'sets'],
  m: ['m', 'm'],
  ml: ['ml', 'ml'],
  g: ['g', 'g'],
  sheet: ['sheet', 'sheets'],
  roll: ['roll', 'rolls'],
  bottle: ['bottle', 'bottles'],
};

/** What one of it is, or several. */
export const unitWord = (unit: HardwareUnit, count = 1): string => words[unit][count === 1 ? 0 : 1];

/** 12 pairs; pieces are not named, since that is what everybody counts. */
export function countedText(count: number, unit: HardwareUnit): string {
  return unit === 'piece' ? countText(count) : `${countText(count)} ${unitWord(unit, count)}`;
}

import type { Decimal } from 'decimal.js';
import { convert, figureWords, rackFootage, toAtMost, type AreaHabit } from '@hidewright/domain';

export const areaSigns = { ft2: 'ft²', dm2: 'dm²', m2: 'm²' } as const;
const places = { ft2: 2, dm2: 1, m2: 3 } as const;

/** An area in mm² in the shop's own unit, exactly enough for a paper or a refusal: "12.42 ft²". */
export function sayArea(areaMm2: Decimal, unit: keyof typeof areaSigns): string {
  const figure = toAtMost(convert(areaMm2, 'mm2', unit), places[unit]);
  return `${figureWords(figure)} ${areaSigns[unit]}`;
}

/** An area on the rack as the shop says it, in tenths or quarters of a foot: "12.4 ft²", "12² ft²". */
export function sayRackArea(areaMm2: Decimal, habit: AreaHabit): string {
  const footage = rackFootage(areaMm2.toFixed(), habit);
  return footage === undefined ? sayArea(areaMm2, habit.areaUnit) : `${footage} ${areaSigns.ft2}`;
}

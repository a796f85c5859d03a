import type { Decimal } from 'decimal.js';
import { convert, toAtMost } from '@hidewright/domain';

export const areaSigns = { ft2: 'ft²', dm2: 'dm²', m2: 'm²' } as const;
const places = { ft2: 2, dm2: 1, m2: 3 } as const;

/** An area in mm² in the shop's own unit, for a sentence: "12.4 ft²". */
export function sayArea(areaMm2: Decimal, unit: keyof typeof areaSigns): string {
  return `${toAtMost(convert(areaMm2, 'mm2', unit), places[unit])} ${areaSigns[unit]}`;
}

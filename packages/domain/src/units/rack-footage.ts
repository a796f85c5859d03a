import type { Decimal } from 'decimal.js';
import { Exact } from '../numbers/decimal-text.ts';
import { formatFootage } from './footage.ts';
import { MM2_PER_FT2 } from './measures.ts';

/** How a shop says areas. */
export interface AreaHabit {
  areaUnit: 'ft2' | 'dm2' | 'm2';
  areaShown: 'tenth' | 'quarter';
}

/**
 * An area on the rack in ft² as the shop says it: 24.8 in tenths, 24³ in quarters. Below one foot both would say too
 * little, and dm² and m² know neither habit: undefined there, and it is said like any other area.
 */
export function rackFootage(
  areaMm2: Decimal | string,
  { areaUnit, areaShown }: AreaHabit,
): string | undefined {
  const area = new Exact(areaMm2);
  if (areaUnit !== 'ft2' || area.abs().lt(MM2_PER_FT2)) return undefined;
  return `${area.isNegative() ? '-' : ''}${formatFootage(area.abs(), areaShown)}`;
}

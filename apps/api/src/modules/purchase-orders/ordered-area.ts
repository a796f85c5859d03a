import { countWords, wholes } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import type { PurchaseLine } from '@hidewright/contract';
import { sayArea, type areaSigns } from '../stock/say-area.ts';

/** How much leather a line asks for, as its supplier reads it: "105 ft²", or "5 sides, about 110 ft²". */
export function sayOrderedArea(
  { areaMm2, whole }: Pick<PurchaseLine, 'areaMm2' | 'whole'>,
  areaUnit: keyof typeof areaSigns,
): string {
  const area = sayArea(new Decimal(areaMm2 ?? 0), areaUnit);
  return whole === null ? area : `${countWords(whole.count)} ${wholes(whole)}, about ${area}`;
}

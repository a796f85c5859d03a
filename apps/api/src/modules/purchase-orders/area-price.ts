import { priceFromFt2 } from '@hidewright/domain';
import { areaSigns } from '../stock/say-area.ts';

/** The price of a ft² as one of the shop's own unit: "1.0226" of "per dm²". In ft² it stays as it was typed. */
export function areaPriceOf(pricePerFt2: string, unit: keyof typeof areaSigns) {
  const unitPrice = unit === 'ft2' ? pricePerFt2 : priceFromFt2(pricePerFt2, unit);
  return { unitPrice, per: `per ${areaSigns[unit]}` };
}

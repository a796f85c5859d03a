import { areaText, countText } from '../../lib/formatting.ts';
import type { AreaUnit } from '../../lib/units.ts';

/** Of leather an area, of hardware a count. */
interface Goods {
  areaMm2: string | null;
  quantity: number | null;
}

/** 12.4 ft², or 1,000 */
export const goodsText = ({ areaMm2, quantity }: Goods, unit: AreaUnit): string =>
  areaMm2 === null ? countText(quantity ?? 0) : areaText(areaMm2, unit);

export const isNothing = ({ areaMm2, quantity }: Goods): boolean =>
  Number(areaMm2 ?? quantity ?? 0) === 0;

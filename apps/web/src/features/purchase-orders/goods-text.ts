import type { AreaHabit } from '@hidewright/domain';
import { countText, rackAreaText } from '../../lib/formatting.ts';

/** Of leather an area, of hardware a count. */
interface Goods {
  areaMm2: string | null;
  quantity: number | null;
}

/** 12.4 ft², or 1,000 */
export const goodsText = ({ areaMm2, quantity }: Goods, habit: AreaHabit): string =>
  areaMm2 === null ? countText(quantity ?? 0) : rackAreaText(areaMm2, habit);

export const isNothing = ({ areaMm2, quantity }: Goods): boolean =>
  Number(areaMm2 ?? quantity ?? 0) === 0;

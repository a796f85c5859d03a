import { countedWords, type AreaHabit, type HardwareUnit } from '@hidewright/domain';
import { rackAreaText } from '../../lib/formatting.ts';

/** Of leather an area, of hardware a count. */
interface Goods {
  areaMm2: string | null;
  quantity: number | null;
}

/** 12.4 ft², or 1,000; 250 ml of what is counted in ml */
export const goodsText = (
  { areaMm2, quantity }: Goods,
  habit: AreaHabit,
  unit: HardwareUnit | null = null,
): string =>
  areaMm2 === null ? countedWords(quantity ?? 0, unit ?? 'piece') : rackAreaText(areaMm2, habit);

export const isNothing = ({ areaMm2, quantity }: Goods): boolean =>
  Number(areaMm2 ?? quantity ?? 0) === 0;

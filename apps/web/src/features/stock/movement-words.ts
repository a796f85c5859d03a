import type { MovementKind } from '@hidewright/contract';
import type { AreaHabit } from '@hidewright/domain';
import { countText, rackAreaText } from '../../lib/formatting.ts';

export const movementWords: Readonly<Record<MovementKind, string>> = {
  receive: 'received',
  take: 'taken',
  return: 'brought back',
  reject: 'rejected',
  adjust: 'adjusted',
  count: 'counted',
};

/** What a row of the ledger or a reservation is about: an area, or pieces. */
export interface Quantity {
  areaMm2: string | null;
  quantity: number | null;
}

/** 12.4 ft², or 600 */
export function quantityText({ areaMm2, quantity }: Quantity, habit: AreaHabit): string {
  return areaMm2 === null ? countText(quantity ?? 0) : rackAreaText(areaMm2, habit);
}

/** Like `quantityText`, with a plus where something came in. */
export function signedText(moved: Quantity, habit: AreaHabit): string {
  const text = quantityText(moved, habit);
  return Number(moved.areaMm2 ?? moved.quantity) > 0 ? `+${text}` : text;
}

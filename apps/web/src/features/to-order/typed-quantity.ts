import type { OrderSuggestionReply } from '@hidewright/contract';
import { readWhole } from '../../lib/comma.ts';
import { areaFigure, areaUnits, readArea } from '../../lib/units.ts';
import type { Workshop } from '../../lib/workshop.tsx';

type Item = Pick<OrderSuggestionReply, 'of' | 'unit' | 'quantity' | 'usual'>;

/** What would be ordered, unless something else is typed. */
const proposed = ({ quantity, usual }: Item): string => (quantity === '0' ? usual : quantity);

/** The same as it stands in the field. */
export function proposedText(item: Item, { areaUnit }: Workshop): string {
  return item.of === 'leather' ? areaFigure(proposed(item), areaUnit, 2) : proposed(item);
}

/** What stands in the field, in the contract's unit; undefined if it is no quantity above 0. */
export function readQuantity(text: string, item: Item, workshop: Workshop): string | undefined {
  // What nobody touched is sent exactly, not as it was rounded for the eye.
  if (text === proposedText(item, workshop)) return proposed(item);
  if (item.of === 'leather') return above0(readArea(text, workshop.areaUnit));
  const plain = readWhole(text);
  return plain !== undefined && plain.length <= 8 ? above0(String(Number(plain))) : undefined;
}

const above0 = (text: string | undefined): string | undefined =>
  text === undefined || Number(text) <= 0 ? undefined : text;

export function signOf({ of, unit }: Item, { areaUnit }: Workshop): string {
  if (of === 'leather') return areaUnits[areaUnit].sign;
  return unit === 'piece' ? 'pieces' : unit;
}

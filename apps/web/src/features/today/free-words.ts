import type { ShortItem } from '@hidewright/contract';
import { countText } from '../../lib/formatting.ts';

/** How much of a thing is free: the figure, and what follows it. */
export function freeWords({ free, reorderAt }: Pick<ShortItem, 'free' | 'reorderAt'>): {
  figure: string;
  rest: string;
} {
  // The figure stays beside its word where the line breaks.
  const keep = `keep\u00a0${countText(reorderAt)}`;
  if (free > 0) return { figure: countText(free), rest: `free, ${keep}` };
  const tooFew = free < 0 ? `, ${countText(-free)} too few` : '';
  return { figure: 'None', rest: `free${tooFew}, ${keep}` };
}

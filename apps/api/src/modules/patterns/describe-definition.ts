import { outlineOf, type LayoutAsked } from '@hidewright/contract';
import { describeOutline } from '@hidewright/domain';

/** A pattern's shape in a few words: "round, 95 mm", or "21 from a panel, by hand count". */
export function describeDefinition({
  outline,
  handCount,
}: Pick<LayoutAsked, 'outline' | 'handCount'>): string {
  if (outline !== null) return describeOutline(outlineOf(outline));
  return handCount === null ? '' : `${handCount.pieces} from a panel, by hand count`;
}

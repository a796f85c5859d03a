import { type LeatherWeight, weightOfLots } from '../leather/leather-weight.ts';
import type { LeatherFacts } from './check-leather.ts';

/**
 * What weighs the leather that a run is cut from: lots with a weight of their own by that, those of one weight
 * together; other lots, and what is yet to come, by the range of their leather.
 */
export function weightsCut({ leather, takes, piecesNeeded }: LeatherFacts): LeatherWeight[] {
  const tags = new Map<string, string[]>();
  let others = piecesNeeded;
  for (const { lot, pieces } of takes) {
    if (lot.weightOz === null || lot.weightOz === undefined) continue;
    tags.set(lot.weightOz, [...(tags.get(lot.weightOz) ?? []), lot.tag]);
    others -= pieces;
  }
  const range = others > 0 && leather.weight !== undefined ? [leather.weight] : [];
  return [...range, ...[...tags].map(([weightOz, lots]) => weightOfLots(weightOz, lots))];
}

import { compareArea } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import { unscaled } from '../../db/columns/scaled-decimal.ts';
import type { ReceiptLine } from './receipt-line.entity.ts';

/** What lots miss of their marks in all, of those that miss more than the tolerance. */
export function missingAreaOf(
  lines: Pick<ReceiptLine, 'quantity' | 'markedAreaMm2'>[],
  tolerancePercent: Decimal,
): Decimal {
  const missing = lines.flatMap(({ quantity, markedAreaMm2: marked }) => {
    if (marked === null) return [];
    const measured = unscaled(quantity, 3);
    const { short } = compareArea(marked.toFixed(), measured.toFixed(), tolerancePercent.toFixed());
    return short ? [marked.minus(measured)] : [];
  });
  return Decimal.sum(0, ...missing);
}

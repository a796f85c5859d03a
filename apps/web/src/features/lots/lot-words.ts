import type { Lot } from '@hidewright/contract';
import { countText, sizeText } from '../../lib/formatting.ts';
import type { LengthUnit } from '../../lib/units.ts';

/** side; 12 panels, 11 × 13 in */
export function formText(
  lot: Pick<Lot, 'form' | 'pieces' | 'widthMm' | 'heightMm'>,
  unit: LengthUnit,
): string {
  const { form, pieces, widthMm, heightMm } = lot;
  const word = pieces === 1 ? form : `${countText(pieces)} ${pluralOf(form)}`;
  const size = widthMm !== null && heightMm !== null ? sizeText(widthMm, heightMm, unit) : '';
  return [word, size].filter(Boolean).join(', ');
}

function pluralOf(form: Lot['form']): string {
  return form === 'belly' ? 'bellies' : `${form}s`;
}

/** How many cuts lie between a lot and the one that came in. */
export function depthOf(
  lots: readonly { lotId: number; parentId: number | null }[],
  lotId: number,
): number {
  const parentId = lots.find((lot) => lot.lotId === lotId)?.parentId ?? null;
  return parentId === null ? 0 : 1 + depthOf(lots, parentId);
}

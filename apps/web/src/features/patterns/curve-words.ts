import type { ClosedCurve, Drawing } from '@hidewright/domain';
import { sizeText } from '../../lib/formatting.ts';
import type { LengthUnit } from '../../lib/units.ts';

/** "80 × 45 mm", in the shop's unit once the drawing has a size. */
export function curveWords(
  { width, height }: Pick<ClosedCurve, 'width' | 'height'>,
  unit: Drawing['unit'],
  lengthUnit: LengthUnit,
): string {
  if (unit === 'mm') return sizeText(width.toFixed(3), height.toFixed(3), lengthUnit);
  return `${round(width)} × ${round(height)} ${unit}`;
}

const round = (value: number): string => String(Number(value.toPrecision(4)));

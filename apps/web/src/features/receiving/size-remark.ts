import { offcutAreaMm2 } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import { countText, rackAreaText, sizeText } from '../../lib/formatting.ts';
import { isFigure } from '../../lib/units.ts';
import type { Workshop } from '../../lib/workshop.tsx';

/** What is typed of a bundle; anything while it is half typed. */
export interface TypedSize {
  measured: unknown;
  pieces: unknown;
  width: unknown;
  height: unknown;
}

type Habit = Pick<Workshop, 'areaUnit' | 'areaShown' | 'lengthUnit'>;

/** Where pieces of such a size cannot have the area that was measured: one of the figures is wrong. */
export function sizeRemark(typed: TypedSize, habit: Habit): string {
  const { measured, pieces, width, height } = typed;
  if (![measured, pieces, width, height].every(isAboveZero)) return '';
  const [widthMm, heightMm] = [String(width), String(height)];
  const all = new Decimal(offcutAreaMm2({ widthMm, heightMm, areaMm2: null })).times(
    Number(pieces),
  );
  // A gauge and a rule each miss a little.
  if (all.times('1.01').gte(String(measured))) return '';
  const size = sizeText(widthMm, heightMm, habit.lengthUnit);
  return `${countText(Number(pieces))} of ${size} are ${rackAreaText(all.toFixed(), habit)} at most: look at the area, the size or the count again.`;
}

const isAboveZero = (value: unknown): boolean =>
  isFigure(String(value ?? '')) && Number(value) > 0 && Number(value) < 1e12;

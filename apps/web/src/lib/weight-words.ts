import { convert } from '@hidewright/domain';
import { numberText } from './formatting.ts';
import { isFigure } from './units.ts';

interface Weight {
  weightLowOz: string | null;
  weightHighOz: string | null;
}

/** 5–6 oz (2.0–2.4 mm); empty where no weight was given. */
export function weightText({ weightLowOz, weightHighOz }: Weight): string {
  if (weightLowOz === null) return '';
  const high = weightHighOz ?? weightLowOz;
  const oz = rangeText(numberText(weightLowOz, 2), numberText(high, 2));
  return `${oz} oz (${thicknessText({ weightLowOz, weightHighOz })})`;
}

/** The same as a thickness: an ounce is 1/64 in. Empty while it is no weight yet. */
export function thicknessText({ weightLowOz, weightHighOz }: Weight): string {
  if (weightLowOz === null || !isFigure(weightLowOz)) return '';
  const high = weightHighOz !== null && isFigure(weightHighOz) ? weightHighOz : weightLowOz;
  const mm = (oz: string) => convert(oz, 'oz', 'mm').toFixed(1);
  return `${rangeText(mm(weightLowOz), mm(high))} mm`;
}

const rangeText = (low: string, high: string) => (low === high ? low : `${low}–${high}`);

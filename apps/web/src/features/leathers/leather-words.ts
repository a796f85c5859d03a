import type { Leather } from '@hidewright/contract';
import { numberText } from '../../lib/formatting.ts';

/** 5–6 oz; empty where no weight was given. */
export function weightText({
  weightLowOz,
  weightHighOz,
}: Pick<Leather, 'weightLowOz' | 'weightHighOz'>): string {
  if (weightLowOz === null) return '';
  const low = numberText(weightLowOz, 3);
  const high = weightHighOz === null ? low : numberText(weightHighOz, 3);
  return low === high ? `${low} oz` : `${low}–${high} oz`;
}

/** Tannage, colour, finish and weight, as far as they are known. */
export function leatherDetail(leather: Leather): string {
  const { tannage, colour, finish } = leather;
  return [tannage, colour, finish, weightText(leather)].filter(Boolean).join(' · ');
}

import type { Leather } from '@hidewright/contract';
import { weightText } from '../../lib/weight-words.ts';

/** Tannage, colour, finish and weight, as far as they are known. */
export function leatherDetail(leather: Leather): string {
  const { tannage, colour, finish } = leather;
  return [tannage, colour, finish, weightText(leather)].filter(Boolean).join(' · ');
}

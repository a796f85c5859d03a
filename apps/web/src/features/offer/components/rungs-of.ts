import type { Offer } from '@hidewright/contract';

/** The quantities of an option, or of the piece as it is. */
export function rungsOf(offer: Offer, option: string | null): Offer['breaks'] {
  return offer.options.find(({ name }) => name === option)?.breaks ?? offer.breaks;
}

import { Exact, toPlaces } from '@hidewright/domain';

export type Price = (areaMm2: string) => string;

/** What an area costs at a price per ft², to four places. */
export function priceOfArea(pricePerFt2: string): Price {
  return (areaMm2) => toPlaces(new Exact(areaMm2).div('92903.04').times(pricePerFt2), 4);
}

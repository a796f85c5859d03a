import type { FinishedMovement, FinishedPiece } from '@hidewright/contract';
import { countText } from '../../lib/formatting.ts';

type Named = Pick<FinishedPiece, 'patternName' | 'option' | 'sort'>;

/** "Round coaster, brass rivets, seconds" */
export function finishedName({ patternName, option, sort }: Named): string {
  return [patternName, option, sort === 'seconds' && 'seconds'].filter(Boolean).join(', ');
}

export const movedWords: Readonly<Record<FinishedMovement['kind'], string>> = {
  made: 'made',
  sold: 'sold',
  given: 'given away',
  spoiled: 'spoiled',
  count: 'counted',
  'put back': 'put back',
};

type OnShelf = Pick<FinishedPiece, 'sort' | 'onHand' | 'option' | 'place' | 'customerId'>;

/**
 * "24 finished ones are on the shelf, 6 of them in brass; and 3 seconds." for the customer of a new quote; undefined
 * where there are none that the customer could have.
 */
export function shelfWords(
  pieces: readonly OnShelf[],
  customerId: number | undefined,
): string | undefined {
  const theirs = pieces.filter(
    (piece) => piece.customerId === null || piece.customerId === customerId,
  );
  const of = (sort: OnShelf['sort']) => theirs.filter((piece) => piece.sort === sort);
  const count = (some: readonly OnShelf[]) => some.reduce((sum, { onHand }) => sum + onHand, 0);
  const [good, seconds] = [count(of('good')), count(of('seconds'))];
  if (good + seconds === 0) return undefined;
  const options = of('good')
    .filter(({ option, onHand }) => option !== null && onHand > 0)
    .map(({ option, onHand }) => `, ${countText(onHand)} of them ${option}`)
    .join('');
  const words = [
    ...(good > 0 ? [`${countText(good)} finished ${good === 1 ? 'one' : 'ones'}${options}`] : []),
    ...(seconds > 0
      ? [`${countText(seconds)} finished ${seconds === 1 ? 'second' : 'seconds'}`]
      : []),
  ];
  return `${words.join(' and ')} ${good + seconds === 1 ? 'is' : 'are'} on the shelf.`;
}

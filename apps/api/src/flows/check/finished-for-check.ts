import type { FinishedPiece } from '@hidewright/contract';
import { countWords } from '@hidewright/domain';
import type { EntityManager } from '@mikro-orm/sqlite';
import { readFinishedList } from '../../modules/finished-pieces/read-finished.ts';
import type { PlannedRun } from './runs-asked.ts';

/** What lies finished of the runs' patterns, some 200 kinds of each at most. */
export function finishedOf(
  em: EntityManager,
  planned: readonly PlannedRun[],
): Promise<FinishedPiece[]> {
  const patternId = [...new Set(planned.map(({ plan }) => plan.patternId))];
  return readFinishedList(em, { patternId, there: 'yes', limit: 200 * patternId.length });
}

/** "24 finished ones are on the shelf, tray 3.": pieces of the same kind that this customer could have. */
export function finishedWords(
  there: readonly FinishedPiece[],
  { plan, option, customerId }: PlannedRun,
): string[] {
  const alike = there.filter(
    (piece) =>
      piece.patternId === plan.patternId &&
      piece.option === option &&
      (piece.customerId === null || piece.customerId === customerId),
  );
  const said = (sort: FinishedPiece['sort'], words: [one: string, more: string]) => {
    const of = alike.filter((piece) => piece.sort === sort);
    const count = of.reduce((sum, { onHand }) => sum + onHand, 0);
    const places = [...new Set(of.map(({ place }) => place).filter(Boolean))];
    return count === 0
      ? []
      : [
          `${countWords(count)} ${count === 1 ? words[0] : words[1]} on the shelf${places.map((place) => `, ${place}`).join('')}.`,
        ];
  };
  return [
    ...said('good', ['finished one is', 'finished ones are']),
    ...said('seconds', ['finished second is', 'finished seconds are']),
  ];
}

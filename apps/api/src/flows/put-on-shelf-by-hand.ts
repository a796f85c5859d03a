import type { BodyOf, putOnShelf } from '@hidewright/contract';
import { Decimal } from 'decimal.js';
import { invalid } from '../http/problem.ts';
import { Customer } from '../modules/customers/customer.entity.ts';
import { putFoundFinished } from '../modules/finished-pieces/finished-ledger.ts';
import type { FinishedPiece } from '../modules/finished-pieces/finished-piece.entity.ts';
import { definitionOf, latestVersion } from '../modules/patterns/pattern-versions.ts';
import { Pattern } from '../modules/patterns/pattern.entity.ts';
import type { Work } from '../work.ts';

type Typed = BodyOf<typeof putOnShelf>;

/**
 * Puts pieces on the shelf that no job of the shop put there: found in a box, or there before the program was.
 * @throws {Problem} 422 naming what is not there, or a cost that the maker typed
 */
export async function putOnShelfByHand(work: Work, typed: Typed): Promise<FinishedPiece> {
  const { patternId, option, sort, customerId, quantity, unitCost, place, reason } = typed;
  await requireKind(work, typed);
  if (work.actor.role === 'maker' && unitCost !== null)
    throw invalid([{ field: 'unitCost', message: 'Leave the cost to the owner.' }]);
  const piece = await putFoundFinished(
    work,
    { patternId, optionName: option ?? '', sort, customerId },
    { quantity, unitCost: unitCost === null ? null : new Decimal(unitCost), reason },
  );
  if (place !== '') piece.place = place;
  await work.em.flush();
  return piece;
}

async function requireKind(work: Work, { patternId, option, customerId }: Typed): Promise<void> {
  const pattern = await work.em.findOne(Pattern, patternId);
  if (pattern === null)
    throw invalid([{ field: 'patternId', message: 'Choose a pattern from the list.' }]);
  if (customerId !== null && (await work.em.findOne(Customer, customerId)) === null)
    throw invalid([{ field: 'customerId', message: 'Choose a customer from the list.' }]);
  if (option === null) return;
  const { options = [] } = definitionOf(await latestVersion(work, pattern));
  if (options.some(({ name }) => name === option)) return;
  const message = `${pattern.name} has no option "${option}". Choose one that it has.`;
  throw invalid([{ field: 'option', message }]);
}

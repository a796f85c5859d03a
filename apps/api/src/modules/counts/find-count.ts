import type { EntityManager } from '@mikro-orm/sqlite';
import { notFound, wrongState } from '../../http/problem.ts';
import { CountLine } from './count-line.entity.ts';
import { StockCount } from './stock-count.entity.ts';

/** @throws {Problem} 404 */
export async function findCount(em: EntityManager, id: number): Promise<StockCount> {
  const sheet = await em.findOne(StockCount, id);
  if (sheet === null) throw notFound('count sheet');
  return sheet;
}

/** @throws {Problem} 404 when the line is not on that sheet */
export async function findCountLine(
  em: EntityManager,
  countId: number,
  id: number,
): Promise<CountLine> {
  const line = await em.findOne(CountLine, { id, countId });
  if (line === null) throw notFound('line on this sheet');
  return line;
}

export function linesOf(em: EntityManager, countId: number): Promise<CountLine[]> {
  return em.find(CountLine, { countId }, { orderBy: { id: 'asc' } });
}

/** Somebody counted it, or saw it hang there. */
export const isCounted = ({ countedAt }: CountLine): boolean => countedAt !== null;

const happened: Record<StockCount['state'], string> = {
  open: 'is still being counted',
  'handed in': 'was handed in',
  approved: 'was approved',
  cancelled: 'was put aside',
};

const allows: Record<StockCount['state'], string[]> = {
  open: ['count', 'hand it in', 'put it aside'],
  'handed in': ['approve it', 'ask for a recount', 'put it aside'],
  approved: ['open a new sheet'],
  cancelled: ['open a new sheet'],
};

/** @throws {Problem} 409 with what happened to the sheet and what can be done with it */
export function requireCountState(sheet: StockCount, ...states: StockCount['state'][]): void {
  if (states.includes(sheet.state)) return;
  const by = sheet.settledByName ?? sheet.handedInByName;
  const who = sheet.state === 'open' || by === null ? '' : ` by ${by}`;
  const next = allows[sheet.state];
  throw wrongState(
    `The sheet ${sheet.title} ${happened[sheet.state]}${who}. You can ${next.join(', or ')}.`,
    next,
  );
}

import { wrongState } from '../../http/problem.ts';
import type { Tool } from './tool.entity.ts';

type State = Tool['state'];
type Known = Pick<Tool, 'kind' | 'number' | 'state'>;

/** What the form may choose; giving back and scrapping are acts of their own. */
const next: Record<State, readonly State[]> = {
  'on order': ['on the rack'],
  'on the rack': [],
  returned: ['on the rack'],
  scrapped: [],
};

/** @throws {Problem} 409 with what is allowed: a scrapped tool stays scrapped, and nothing goes back on order */
export function requireNextState(tool: Known, wanted: State): void {
  if (wanted === tool.state || next[tool.state].includes(wanted)) return;
  const rest = next[tool.state];
  throw wrongState(`The ${tool.kind} ${tool.number} is ${tool.state}. ${adviceFor(tool, wanted)}`, [
    ...rest,
  ]);
}

function adviceFor({ state }: Known, wanted: State): string {
  if (state === 'scrapped') return 'Add a new one instead.';
  if (wanted === 'scrapped') return 'Press Scrap it, so that the log says who did.';
  if (wanted === 'returned') return 'Press Give it back, so that the log says who did.';
  return state === 'on the rack' ? 'Leave it there.' : 'Choose on the rack.';
}

/** @throws {Problem} 409 for what is not on the rack, and for the shop's own */
export function requireReturnable(tool: Known & Pick<Tool, 'ownedBy'>): void {
  const name = `The ${tool.kind} ${tool.number}`;
  if (tool.state !== 'on the rack')
    throw wrongState(`${name} is ${tool.state}. Only what is on the rack can be given back.`);
  if (tool.ownedBy === 'shop') {
    throw wrongState(`${name} is the shop’s own. Scrap it, or change first whose it is.`, [
      'scrap it',
    ]);
  }
}

/** @throws {Problem} 409 for what is not here any more */
export function requireScrappable(tool: Known): void {
  if (tool.state === 'on the rack' || tool.state === 'on order') return;
  throw wrongState(`The ${tool.kind} ${tool.number} is ${tool.state} already.`);
}

import { wrongState } from '../../http/problem.ts';
import type { Tool } from './tool.entity.ts';

type State = Tool['state'];

const next: Record<State, readonly State[]> = {
  'on order': ['on the rack', 'scrapped'],
  'on the rack': ['scrapped'],
  scrapped: [],
};

/** @throws {Problem} 409 with what is allowed: a scrapped tool stays scrapped, and nothing goes back on order */
export function requireNextState(
  tool: Pick<Tool, 'kind' | 'number' | 'state'>,
  wanted: State,
): void {
  if (wanted === tool.state || next[tool.state].includes(wanted)) return;
  const rest = next[tool.state];
  const advice = rest.length === 0 ? 'Add a new one instead.' : `Choose ${rest.join(' or ')}.`;
  throw wrongState(`The ${tool.kind} ${tool.number} is ${tool.state}. ${advice}`, [...rest]);
}

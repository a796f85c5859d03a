import type { Tool } from './tool.entity.ts';

/** A customer's own that is still here on the last day it is kept, or after. */
export function isTermOver(
  { keptUntil, state }: Pick<Tool, 'keptUntil' | 'state'>,
  today: string,
): boolean {
  return state === 'on the rack' && keptUntil !== null && keptUntil <= today;
}

import type { PatternDefinition } from '@hidewright/contract';

/**
 * A definition with the pieces behind its rejects, unless the rejects were changed by hand: pieces that stood behind
 * other rejects say nothing of these.
 */
export function withHistoryOf(
  before: PatternDefinition,
  after: PatternDefinition,
): PatternDefinition {
  if (after.history === null || !sameHistory(before.history, after.history)) return after;
  return rejectsOf(before) === rejectsOf(after) ? after : { ...after, history: null };
}

const sameHistory = (one: PatternDefinition['history'], other: PatternDefinition['history']) =>
  one?.good === other?.good && one?.total === other?.total;

function rejectsOf({ work }: PatternDefinition): string {
  const rates =
    work.kind === 'steps' ? work.steps.map((step) => step.rejectPercent) : [work.rejectPercent];
  return rates.map(Number).join(' ');
}

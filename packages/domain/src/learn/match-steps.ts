/** What a step is known by. */
export interface NamedStep {
  name: string;
  per: string;
}

/**
 * For each step of a pattern the place of the same step in a run that was made by an earlier version:
 * the same name (whatever its capitals) counted per the same unit; where a name comes several times,
 * the first meets the first, the second the second. Null where the run had no such step.
 */
export function matchSteps(
  now: readonly NamedStep[],
  then: readonly NamedStep[],
): (number | null)[] {
  const free = new Map<string, number[]>();
  then.forEach((step, at) => free.set(keyOf(step), [...(free.get(keyOf(step)) ?? []), at]));
  return now.map((step) => free.get(keyOf(step))?.shift() ?? null);
}

const keyOf = ({ name, per }: NamedStep): string => `${per} ${name.trim().toLowerCase()}`;

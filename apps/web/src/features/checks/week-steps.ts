import type { ShortForRuns } from '@hidewright/contract';
import { daysBetween } from '@hidewright/domain';

export interface WeekStep {
  /** days from today */
  after: number;
  /** free from then on, below 0 where it does not suffice */
  left: number;
}

/** What is free today, and after every day on which something comes or goes. */
export function weekSteps(
  { onHand, reserved, days }: Pick<ShortForRuns, 'onHand' | 'reserved' | 'days'>,
  today: string,
): WeekStep[] {
  const now = Math.max(0, Number(onHand) - Number(reserved));
  return [
    { after: 0, left: now },
    ...days.map(({ day, left }) => ({ after: daysBetween(today, day), left: Number(left) })),
  ];
}

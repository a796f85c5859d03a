import { daysBetween } from '@hidewright/domain';

/** How a thing goes on, as the API says it. */
export interface ComingOf {
  name: string;
  onHand: string;
  reserved: string;
  days: readonly { day: string; left: string }[];
  runsOutOn: string | null;
}

export interface WeekStep {
  /** days from today */
  after: number;
  /** free from then on, below 0 where it does not suffice */
  left: number;
}

/** What is free today, and after every day on which something comes or goes. */
export function weekSteps(
  { onHand, reserved, days }: Pick<ComingOf, 'onHand' | 'reserved' | 'days'>,
  today: string,
): WeekStep[] {
  const now = Math.max(0, Number(onHand) - Number(reserved));
  return [
    { after: 0, left: now },
    ...days.map(({ day, left }) => ({ after: daysBetween(today, day), left: Number(left) })),
  ];
}

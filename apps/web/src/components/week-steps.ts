import { daysBetween } from '@hidewright/domain';

/** How a thing goes on, as the API says it. */
export interface ComingOf {
  name: string;
  onHand: string;
  reserved: string;
  days: readonly { day: string; comes: string; left: string }[];
  runsOutOn: string | null;
}

export interface WeekStep {
  /** days from today */
  after: number;
  /** free from then on, below 0 where it does not suffice */
  left: number;
  /** what is on order and comes on that day */
  comes: number;
}

/** What is free today, and after every day on which something comes or goes. */
export function weekSteps(
  { onHand, reserved, days }: Pick<ComingOf, 'onHand' | 'reserved' | 'days'>,
  today: string,
): WeekStep[] {
  const now = Math.max(0, Number(onHand) - Number(reserved));
  return [
    { after: 0, left: now, comes: 0 },
    ...days.map(({ day, left, comes }) => ({
      after: daysBetween(today, day),
      left: Number(left),
      comes: Number(comes),
    })),
  ];
}

/** Of what is on hand, held for jobs: it stays on the shelf until they use it. */
export const heldOf = ({ onHand, reserved }: Pick<ComingOf, 'onHand' | 'reserved'>): number =>
  Math.min(Number(onHand), Number(reserved));

/** What there is, in a sentence for whoever does not see the picture. */
export function spokenWeeks(
  item: ComingOf,
  { say, dayText }: { say: (value: string) => string; dayText: (day: string) => string },
): string {
  const [held, free] = [heldOf(item), Number(item.onHand) - heldOf(item)];
  const comes = item.days.filter((each) => Number(each.comes) > 0);
  return [
    `${item.name}: ${say(item.onHand)} there`,
    `${say(String(held))} of it held for jobs`,
    `${say(String(free))} free today`,
    ...comes.map((each) => `${say(each.comes)} comes ${dayText(each.day)}`),
    ...(item.runsOutOn === null ? [] : [`too little from ${dayText(item.runsOutOn)}`]),
  ].join(', ');
}

import { dayText } from '../../lib/formatting.ts';

/** Sun 1 Nov to Mon 30 Nov 2026 */
export function periodText({ fromDay, toDay }: { fromDay: string; toDay: string }): string {
  if (fromDay === toDay) return `${dayText(toDay)} ${toDay.slice(0, 4)}`;
  const sameYear = fromDay.slice(0, 4) === toDay.slice(0, 4);
  return `${dayText(fromDay)}${sameYear ? '' : ` ${fromDay.slice(0, 4)}`} to ${dayText(toDay)} ${toDay.slice(0, 4)}`;
}

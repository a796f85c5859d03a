import type { MachinePays } from '@hidewright/domain';
import { countText, moneyText, numberText, percentText } from '../../lib/formatting.ts';
import type { TypedMachine } from './typed-machine.ts';

/** 250 → 4 h 10 min */
export function hoursAndMinutes(minutes: string): string {
  const whole = Math.round(Number(minutes));
  const [hours, rest] = [Math.floor(whole / 60), whole % 60];
  if (hours === 0) return `${rest} min`;
  return rest === 0 ? `${countText(hours)} h` : `${countText(hours)} h ${rest} min`;
}

/** 14.2 → 1 year 3 months: by the end of that month it is back. */
export function monthsText(months: number): string {
  const whole = Math.max(1, Math.ceil(months));
  const [years, rest] = [Math.floor(whole / 12), whole % 12];
  const parts = [years > 0 && counted(years, 'year'), rest > 0 && counted(rest, 'month')];
  return parts.filter(Boolean).join(' ');
}

const counted = (count: number, word: string) => `${count} ${word}${count === 1 ? '' : 's'}`;

/** What the machine does for the shop, from its price to the runs it needs, in sentences. */
export function paysWords(typed: TypedMachine, pays: MachinePays): string[] {
  const life = counted(Number(typed.years), 'year');
  const hours = hoursAndMinutes(pays.minutesSavedPerMonth);
  return [
    `It saves ${hours} a month, worth ${moneyText(pays.savedPerMonth)} at ${moneyText(typed.hourWorth)} an hour${upkeepWords(pays)}.`,
    pays.paybackMonths === null
      ? `Its price does not come back within ${life}.`
      : `Its price is back after ${monthsText(pays.paybackMonths)}.`,
    `Over ${life} it is worth ${moneyText(pays.presentValue)} today, its price taken off and ${percentText(typed.interestPercent)} a year reckoned for the money.`,
    runsWords(typed, pays),
  ];
}

function upkeepWords({ upkeepPerMonth }: MachinePays): string {
  return Number(upkeepPerMonth) === 0
    ? ''
    : `; its upkeep takes ${moneyText(upkeepPerMonth)} of it`;
}

function runsWords({ runsPerMonth }: TypedMachine, { runsToPay }: MachinePays): string {
  if (runsToPay === null) return 'It saves nothing on a run, so no number of runs pays for it.';
  const asked = `It pays from ${numberText(runsToPay, 1)} ${runsToPay === '1' ? 'run' : 'runs'} a month`;
  return `${asked}; you have ${numberText(runsPerMonth, 2)}.`;
}

import type { WeekMixReply } from '@hidewright/contract';
import { moneyText, numberText } from '../../lib/formatting.ts';

/** 20.33 → 20.3 h */
export const hoursWords = (hours: string): string => `${numberText(hours, 1)} h`;

/** Whether the income needed is reached, and if not, what is short and what would bring it. */
export function incomeWords({ income, left }: WeekMixReply): string {
  if (income.reached) {
    const over = Number(left) - Number(income.needed);
    return `The week leaves ${moneyText(left)}, which is ${moneyText(over.toFixed(2))} over the ${moneyText(income.needed)} that the shop needs.`;
  }
  const short = `The week leaves ${moneyText(left)}: ${moneyText(income.short)} short of the ${moneyText(income.needed)} that the shop needs.`;
  return income.hoursShort === null
    ? `${short} More hours would not bring it: sell more, or ask more.`
    : `${short} ${hoursWords(income.hoursShort)} more a week would bring it; so would a better price.`;
}

/** What one more hour is worth, beside the average one and the wage, so that nobody takes one for the other. */
export function hourWords(mix: WeekMixReply, wagePerHour: string): string {
  const { oneMoreHour, averagePerHour, hours } = mix;
  if (Number(oneMoreHour.left) === 0) {
    const free = Number(hours.free) > 0 ? ` ${hoursWords(hours.free)} are free already.` : '';
    return `One more bench hour would leave nothing more: everything that can be sold is made.${free}`;
  }
  const more = `One more bench hour would leave ${moneyText(oneMoreHour.left)} more, its share of desk time counted; it would go into ${listed(oneMoreHour.into)}.`;
  const average =
    averagePerHour === null
      ? ''
      : ` That is not the average: an hour of this week leaves ${moneyText(averagePerHour)}.`;
  return `${more}${average} ${wageWords(Number(oneMoreHour.left) - Number(wagePerHour), wagePerHour)}`;
}

function wageWords(gain: number, wagePerHour: string): string {
  const wage = `your wage of ${moneyText(wagePerHour)}`;
  return gain > 0
    ? `Paid at ${wage}, it still brings ${moneyText(gain.toFixed(2))}.`
    : `It does not earn ${wage}.`;
}

/** How many hours stay for large pieces. */
export function largeWords({ largePieces, income, kinds }: WeekMixReply): string {
  const { hours, atMost } = largePieces;
  const planned = kinds.some(({ kind }) => kind === 'large piece')
    ? `This mix has ${hoursWords(hours)} for large pieces. `
    : '';
  if (!income.reached || atMost === null) {
    return `${planned}The runs do not carry large pieces yet: the income comes first.`;
  }
  return `${planned}Up to ${hoursWords(atMost)} of the week can go to large pieces, and the income needed is still reached.`;
}

function listed(names: readonly string[]): string {
  const [last = 'other work', ...before] = [...names].reverse();
  return before.length === 0 ? last : `${before.reverse().join(', ')} and ${last}`;
}

import type { BoughtDifference, JobVariances, StepDifference } from '@hidewright/contract';
import { Decimal } from 'decimal.js';
import { minutesText, moneyText } from '../../lib/formatting.ts';

interface Reason {
  amount: Decimal;
  /** "Stamp cost 1.03 more because it took longer." */
  sentence: string;
}

/** Why a run cost other than was said, the largest first; what made no difference is left out. */
export function reasonsFor({ steps, wages, bought }: JobVariances): string[] {
  const reasons = [
    ...steps.flatMap(stepReasons),
    ...(bought ?? []).flatMap(boughtReasons),
    ...roundings(wages?.other, bought ?? []),
  ];
  return reasons
    .filter(({ amount }) => !amount.isZero())
    .sort((a, b) => b.amount.abs().comparedTo(a.amount.abs()))
    .map(({ sentence }) => sentence);
}

function reason(what: string, text: string | undefined, more: string, less: string): Reason {
  const amount = new Decimal(text ?? '0');
  const why = amount.isPositive() ? more : less;
  return { amount, sentence: `${what} cost ${moreOrLess(amount.toFixed(2))} because ${why}.` };
}

/** "4.10 more" */
export function moreOrLess(amount: string): string {
  const exact = new Decimal(amount);
  if (exact.isZero()) return 'as much as was said';
  return `${moneyText(exact.abs().toFixed(2))} ${exact.isPositive() ? 'more' : 'less'}`;
}

function stepReasons({ name, money, wasMinutes }: StepDifference): Reason[] {
  const less = wasMinutes === null ? 'no minutes were logged' : 'it was quicker';
  return [
    reason(name, money?.time, 'it took longer', less),
    reason(name, money?.made, 'it had more to handle', 'it had less to handle'),
    reason(name, money?.wage, 'the hour was dearer', 'the hour was cheaper'),
  ];
}

function boughtReasons({ name, price, usage, made }: BoughtDifference): Reason[] {
  return [
    reason(name, price, 'it was dearer', 'it was cheaper'),
    reason(
      name,
      usage,
      'more of it went into each good piece',
      'less of it went into each good piece',
    ),
    reason(name, made, 'more good pieces came out than were ordered', 'fewer good pieces came out'),
  ];
}

/** What is left between exact figures and rounded lines, in one sentence. */
function roundings(ofWages: string | undefined, bought: readonly BoughtDifference[]): Reason[] {
  const amount = bought.reduce((sum, { other }) => sum.plus(other), new Decimal(ofWages ?? '0'));
  const sentence = `The rest cost ${moreOrLess(amount.toFixed(2))}: rounding, and what the quote reckoned otherwise.`;
  return [{ amount, sentence }];
}

/** "2.8 min more than said for 56 strikes" */
export function stepInWords({ handled, per, saidForMade, wasMinutes }: StepDifference): string {
  const many = per === 'run' ? 'the run' : `${handled} ${handled === 1 ? per : `${per}s`}`;
  if (wasMinutes === null) return `nothing logged; ${minutesText(saidForMade)} said for ${many}`;
  const over = new Decimal(wasMinutes).minus(saidForMade).toDecimalPlaces(1);
  if (over.isZero()) return `as said for ${many}`;
  const word = over.isPositive() ? 'more' : 'less';
  return `${minutesText(over.abs().toFixed())} ${word} than said for ${many}`;
}

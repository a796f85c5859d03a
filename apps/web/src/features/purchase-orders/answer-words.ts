import type { DeliveryAnswer } from '@hidewright/contract';
import { instantText, moneyText } from '../../lib/formatting.ts';
import type { Workshop } from '../../lib/workshop.tsx';

/** USD 7.50 more than ordered */
export function differenceWords(difference: string, { currency }: Pick<Workshop, 'currency'>) {
  const less = difference.startsWith('-');
  return `${currency} ${moneyText(difference.replace('-', ''))} ${less ? 'less' : 'more'} than ordered`;
}

/** What was answered in full: "USD 7.50 more than ordered: Brass went up. (Ines, Tue 1 Dec, 09:00)" */
export function answerWords(
  about: string,
  { reason, by, at }: DeliveryAnswer,
  { timeZone, today }: Pick<Workshop, 'timeZone' | 'today'>,
): string {
  const why = reason === '' ? '' : `: ${reason}`;
  return `${about}${why} (${by}, ${instantText(at, timeZone, today)})`;
}

import { Decimal } from 'decimal.js';
import { moneyText } from './formatting.ts';

/** What a column of amounts adds up to. */
export const sumMoney = (amounts: readonly string[]): string =>
  moneyText(Decimal.sum(0, ...amounts).toFixed(2));

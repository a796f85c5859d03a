import type { Decimal } from 'decimal.js';

/** An amount of money as it travels: two decimals. */
export const moneyText = (amount: Decimal): string => amount.toFixed(2);

/** A unit price as it travels: two decimals, up to four where they are there. */
export const priceText = (price: Decimal): string =>
  price.toFixed(Math.max(2, price.decimalPlaces()));

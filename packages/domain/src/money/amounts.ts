import type { Decimal } from 'decimal.js';
import { InvalidInput } from '../errors/domain-error.ts';
import { type DecimalText, Exact, readDecimal, toPlaces } from '../numbers/decimal-text.ts';

/** Beyond this many minor units a number in JavaScript or SQLite may lose a cent. */
const mostMinorUnits = new Exact(2).pow(53).minus(1);

/**
 * Reads an amount of money as typed, and returns it with all its decimals ('420' → '420.00').
 * Refuses NaN, Infinity, -0, exponents, thousands separators, too many decimals, and more than
 * 2^53 - 1 minor units. An amount below zero is refused unless `belowZero` is set.
 * @throws InvalidInput
 */
export function parseMoney(
  text: string,
  digits: number,
  { field = 'amount', belowZero = false }: { field?: string; belowZero?: boolean } = {},
): DecimalText {
  const limits = belowZero ? { places: digits } : { places: digits, min: 0 };
  const trimmed = typeof text === 'string' ? text.trim() : text;
  return toPlaces(checkSize(readDecimal(trimmed, field, limits), digits, field), digits);
}

/** Quantity times unit price, rounded half up once to the currency's decimals. @throws InvalidInput */
export function lineAmount(
  quantity: number | DecimalText,
  unitPrice: DecimalText,
  digits: number,
): DecimalText {
  const count = readDecimal(String(quantity), 'quantity');
  const amount = count.times(readDecimal(unitPrice, 'unitPrice'));
  return toPlaces(checkSize(amount, digits, 'amount'), digits);
}

/** A unit price as a person writes it: with the currency's decimals, or more where it has them (4.2 → 4.20). */
export function unitPriceInFull(price: DecimalText, digits: number): DecimalText {
  const exact = new Exact(price);
  return exact.toFixed(Math.max(digits, exact.decimalPlaces()));
}

/** The sum of amounts with the currency's decimals; '0.00' for none. @throws InvalidInput */
export function sumMoney(amounts: readonly DecimalText[], digits: number): DecimalText {
  const sum = amounts.reduce(
    (total, amount, at) => total.plus(readDecimal(amount, `amounts.${at}`)),
    new Exact(0) as Decimal,
  );
  return toPlaces(checkSize(sum, digits, 'amounts'), digits);
}

function checkSize(value: Decimal, digits: number, field: string): Decimal {
  if (value.abs().times(new Exact(10).pow(digits)).gt(mostMinorUnits)) {
    throw new InvalidInput(
      field,
      'That amount is larger than the books can hold: write a smaller one.',
    );
  }
  return value;
}

import { Decimal } from 'decimal.js';
import { InvalidInput } from '../errors/domain-error.ts';

/** An exact decimal as plain text: '-12.50'. No exponent, no sign before zero, a point as separator. */
export type DecimalText = string;

/** 40 digits: 26 more than the largest amount of money, so that only named places round. */
export const Exact = Decimal.clone({ precision: 40, rounding: Decimal.ROUND_HALF_UP });

export interface Limits {
  min?: number | string;
  /** Above it, and not at it. */
  above?: number;
  max?: number | string;
  places?: number;
}

const plain = /^-?\d{1,24}(\.\d{1,24})?$/;

/**
 * Reads an exact decimal and refuses everything else: NaN, Infinity, -0, exponents, blanks.
 * @throws InvalidInput naming `field`
 */
export function readDecimal(text: unknown, field: string, limits: Limits = {}): Decimal {
  if (typeof text !== 'string' || !plain.test(text)) {
    throw new InvalidInput(field, `Write ${field} as a plain number, such as 12 or 12.50.`);
  }
  const value = new Exact(text);
  if (value.isZero() && text.startsWith('-')) {
    throw new InvalidInput(field, `Write ${field} as 0, without a minus sign.`);
  }
  checkLimits(value, field, limits);
  return value;
}

function checkLimits(value: Decimal, field: string, { min, above, max, places }: Limits): void {
  if (above !== undefined && value.lte(above)) {
    throw new InvalidInput(field, `Write ${field} as a number above ${above}.`);
  }
  if (min !== undefined && value.lt(min)) {
    throw new InvalidInput(field, `Write ${field} as ${min} or more.`);
  }
  if (max !== undefined && value.gt(max)) {
    throw new InvalidInput(field, `Write ${field} as ${max} or less.`);
  }
  if (places !== undefined && value.decimalPlaces() > places) {
    const digits = places === 0 ? 'a whole number' : `a number with at most ${places} decimals`;
    throw new InvalidInput(field, `Write ${field} as ${digits}.`);
  }
}

/** Refuses anything but a whole number within the limits. @throws InvalidInput */
export function readWhole(
  value: unknown,
  field: string,
  min = 0,
  max = Number.MAX_SAFE_INTEGER,
): number {
  if (
    typeof value !== 'number' ||
    !Number.isInteger(value) ||
    Object.is(value, -0) ||
    value < min ||
    value > max
  ) {
    throw new InvalidInput(field, `Write ${field} as a whole number from ${min} to ${max}.`);
  }
  return value;
}

/** Exact text without trailing zeros and without exponent: 12.5, 0, -3. */
export function toText(value: Decimal): DecimalText {
  return value.isZero() ? '0' : value.toFixed();
}

/** Text with exactly so many places, rounded half up (away from zero): 12.50. */
export function toPlaces(value: Decimal, places: number): DecimalText {
  const text = value.toFixed(places, Decimal.ROUND_HALF_UP);
  return /^-[0.]+$/.test(text) ? text.slice(1) : text;
}

/** Text rounded half up to at most so many places, trailing zeros dropped: 12.5. */
export function toAtMost(value: Decimal, places: number): DecimalText {
  return toText(value.toDecimalPlaces(places, Decimal.ROUND_HALF_UP));
}

/** The next whole number up; the 20th place keeps 9 / 0.3, 30.000…01 by a division's last digit, from being 31. */
export function upToWhole(value: Decimal): Decimal {
  return value.toDecimalPlaces(20).ceil();
}

import { Type } from '@mikro-orm/core';
import { Decimal } from 'decimal.js';

/** An exact decimal kept as a whole number of its smallest part, so that SQL can sum it. */
export abstract class ScaledDecimal extends Type<Decimal | null, number | null> {
  abstract readonly places: number;

  override get runtimeType(): string {
    return 'Decimal';
  }

  override convertToDatabaseValue(
    value: Decimal | string | number | null | undefined,
  ): number | null {
    if (value === null || value === undefined) return null;
    // Raw conditions and default values reach this as plain numbers, already scaled.
    if (typeof value === 'number') return value;
    return scaled(new Decimal(value), this.places);
  }

  override convertToJSValue(value: Decimal | number | null | undefined): Decimal | null {
    if (value === null || value === undefined) return null;
    return value instanceof Decimal ? value : unscaled(value, this.places);
  }

  override compareAsType(): string {
    return 'number';
  }

  override ensureComparable(): boolean {
    return true;
  }

  override getColumnType(): string {
    return 'integer';
  }
}

/** 1, 10, 100, … and 1, 0.1, 0.01, …: every amount that is read or written needs one. */
const powers = Array.from({ length: 10 }, (_, places) => new Decimal(`1e${places}`));
const parts = Array.from({ length: 10 }, (_, places) => new Decimal(`1e-${places}`));

/** @throws {RangeError} when a value has more decimals than its column keeps: rounding is done by name, earlier */
export function scaled(value: Decimal, places: number): number {
  const whole = value.times(powers[places] as Decimal);
  if (!whole.isInteger() || whole.abs().greaterThan(Number.MAX_SAFE_INTEGER)) {
    throw new RangeError(`${value.toString()} does not fit a column of ${places} decimals`);
  }
  return whole.toNumber();
}

export function unscaled(whole: number, places: number): Decimal {
  return new Decimal(whole).times(parts[places] as Decimal);
}

/** The same as text; null where the column is. */
export const unscaledText = (whole: number | null, places: number): string | null =>
  whole === null ? null : unscaled(whole, places).toString();

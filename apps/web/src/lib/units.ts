import { convert, readFootage, readLength as lengthIn, readMixedNumber } from '@hidewright/domain';
import { Decimal } from 'decimal.js';
import { withPoint } from './comma.ts';
import type { Workshop } from './workshop.tsx';

export type AreaUnit = Workshop['areaUnit'];
export type LengthUnit = Workshop['lengthUnit'];

export const areaUnits = {
  ft2: { sign: 'ft²', mm2: '92903.04' },
  dm2: { sign: 'dm²', mm2: '10000' },
  m2: { sign: 'm²', mm2: '1000000' },
} as const;

export const lengthUnits = {
  mm: { sign: 'mm', mm: '1' },
  in: { sign: 'in', mm: '25.4' },
} as const;

/**
 * What was typed in the shop's unit, as mm² to a thousandth; undefined if it is no area. In ft² the marks of a hide
 * are read as well: 24³ and 24/3 are 24¾.
 */
export function readArea(text: string, unit: AreaUnit): string | undefined {
  const read = unit === 'ft2' ? readFootage : readMixedNumber;
  return read(withPoint(text))?.times(areaUnits[unit].mm2).toDecimalPlaces(3).toFixed();
}

/** An area to type in the shop's unit, in the ways in which it may be typed. */
export const areaExamples = {
  ft2: '24.75 or 24³',
  dm2: '230 or 229.5',
  m2: '2.3 or 2.25',
} as const;

/**
 * What was typed in the shop's unit, or in the one written after it (11 in, 4 3/8", 95 mm), as mm to a millionth;
 * undefined if it is no length.
 */
export function readLength(text: string, unit: LengthUnit): string | undefined {
  return lengthIn(withPoint(text), unit)?.toFixed();
}

/**
 * A weight of leather in ounces to a thousandth, as it was typed or from the thickness that was measured (2.4 mm);
 * undefined if it is no weight.
 */
export function readWeight(text: string): string | undefined {
  const [, figure = text, written] = /^(.*?)\s*(oz|mm)$/.exec(text.trim()) ?? [];
  const typed = readMixedNumber(withPoint(figure));
  return (written === 'mm' ? typed && convert(typed, 'mm', 'oz') : typed)
    ?.toDecimalPlaces(3)
    .toFixed();
}

/** An area in the shop's unit, without its sign. */
export function areaFigure(areaMm2: string, unit: AreaUnit, places = 2): string {
  return new Decimal(areaMm2).div(areaUnits[unit].mm2).toDecimalPlaces(places).toFixed();
}

/** A length in the shop's unit, without its sign. */
export function lengthFigure(
  lengthMm: string,
  unit: LengthUnit,
  places = unit === 'mm' ? 1 : 2,
): string {
  return new Decimal(lengthMm).div(lengthUnits[unit].mm).toDecimalPlaces(places).toFixed();
}

export function isFigure(text: string): boolean {
  return /^-?\d+(\.\d+)?$/.test(text);
}

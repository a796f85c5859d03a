import { convert } from '@hidewright/domain';
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

const fractions: Record<string, string> = {
  '¼': '0.25',
  '½': '0.5',
  '¾': '0.75',
  '⅛': '0.125',
  '⅜': '0.375',
  '⅝': '0.625',
  '⅞': '0.875',
  // A small raised figure after the feet counts quarters: 24³ is 24¾ ft².
  '⁰': '0',
  '¹': '0.25',
  '²': '0.5',
  '³': '0.75',
};

/** Reads 24.75, 24,75, 24¾, 24³, 24 3/4 and ¾; nothing that is negative or unclear, as 1,250 is. */
export function readMixedNumber(text: string): Decimal | undefined {
  const plain = withPoint(text);
  if (/^\d{1,7}(\.\d{1,6})?$/.test(plain)) return new Decimal(plain);
  const sign = /^(\d{0,7})\s*([¼½¾⅛⅜⅝⅞⁰¹²³])$/.exec(plain);
  if (sign) return new Decimal(sign[1] || '0').plus(fractions[sign[2] ?? ''] ?? '0');
  const slash = /^(?:(\d{1,7})[\s-])?(\d{1,3})\/(\d{1,3})$/.exec(plain);
  if (!slash || Number(slash[3]) === 0) return undefined;
  return new Decimal(slash[1] ?? '0').plus(new Decimal(slash[2] ?? '0').div(slash[3] ?? '1'));
}

/** What was typed in the shop's unit, as mm² to a thousandth; undefined if it is no area. */
export function readArea(text: string, unit: AreaUnit): string | undefined {
  return readMixedNumber(text)?.times(areaUnits[unit].mm2).toDecimalPlaces(3).toFixed();
}

/**
 * What was typed in the shop's unit, or in the one written after it (11 in, 4 3/8", 95 mm), as mm to a millionth;
 * undefined if it is no length.
 */
export function readLength(text: string, unit: LengthUnit): string | undefined {
  const [, figure = text, written] = /^(.*?)\s*(mm|in|")$/.exec(text.trim()) ?? [];
  const used = written === undefined ? unit : written === 'mm' ? 'mm' : 'in';
  return readMixedNumber(figure)?.times(lengthUnits[used].mm).toDecimalPlaces(6).toFixed();
}

/**
 * A weight of leather in ounces to a thousandth, as it was typed or from the thickness that was measured (2.4 mm);
 * undefined if it is no weight.
 */
export function readWeight(text: string): string | undefined {
  const [, figure = text, written] = /^(.*?)\s*(oz|mm)$/.exec(text.trim()) ?? [];
  const typed = readMixedNumber(figure);
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

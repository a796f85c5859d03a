import type { Decimal } from 'decimal.js';
import { Exact } from '../numbers/decimal-text.ts';

const signs: Record<string, string> = {
  '¼': '0.25',
  '½': '0.5',
  '¾': '0.75',
  '⅛': '0.125',
  '⅜': '0.375',
  '⅝': '0.625',
  '⅞': '0.875',
};

/**
 * Reads a number as people write it on paper: '24.75', '24 3/4', '24-3/4', '24¾', '3/4'; 0 or more and below ten
 * million. Undefined where it is none, or where a fraction is not below 1: 24/3 may mean a mark on a hide.
 */
export function readMixedNumber(text: string): Decimal | undefined {
  const plain = text.trim();
  if (/^\d{1,7}(\.\d{1,9})?$/.test(plain)) return new Exact(plain);
  const [, before, sign] = /^(\d{0,7})\s*([¼½¾⅛⅜⅝⅞])$/.exec(plain) ?? [];
  if (sign !== undefined) return new Exact(before || '0').plus(signs[sign] ?? '0');
  const [, whole, top, bottom] = /^(?:(\d{1,7})(?:\s+|-))?(\d{1,4})\/(\d{1,4})$/.exec(plain) ?? [];
  if (top === undefined || bottom === undefined || Number(top) >= Number(bottom)) return undefined;
  return new Exact(whole ?? '0').plus(new Exact(top).div(bottom));
}

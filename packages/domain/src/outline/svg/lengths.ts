import type { Element } from './read-elements.ts';
import { refusal } from './refusal.ts';

/** mm in each unit; CSS fixes 96 px to the inch. */
const mmPer: Record<string, number> = {
  mm: 1,
  cm: 10,
  q: 0.25,
  in: 25.4,
  pt: 25.4 / 72,
  pc: 25.4 / 6,
  px: 25.4 / 96,
};

const typed = /^\s*([-+]?(?:\d+\.?\d*|\.\d+)(?:e[-+]?\d+)?)\s*(mm|cm|q|in|pt|pc|px)?\s*$/i;

/** A length with its unit; null where there is none, or it is a share of something. */
export function readLength(
  text: string | undefined,
): { value: number; unit: string | null } | null {
  const found = text === undefined || text.length > 40 ? null : typed.exec(text);
  if (!found) return null;
  const value = Number(found[1]);
  return Number.isFinite(value) ? { value, unit: found[2]?.toLowerCase() ?? null } : null;
}

/** A length in mm; null where it does not say its unit. */
export function lengthInMm(text: string | undefined): number | null {
  const length = readLength(text);
  if (!length || length.unit === null) return null;
  return length.value * (mmPer[length.unit] as number);
}

/**
 * A measure of a shape in user units, of which 96 make an inch where it names another unit; 0 where
 * it is not given.
 * @throws InvalidInput where it is there and cannot be read
 */
export function userUnits({ name, attributes }: Element, attribute: string): number {
  const text = attributes.get(attribute);
  if (text === undefined || text.trim() === '' || text.trim() === 'auto') return 0;
  const length = readLength(text);
  if (!length) {
    throw refusal(`The ${attribute} of a ${name} cannot be read: “${text.slice(0, 40)}”.`);
  }
  const { value, unit } = length;
  return unit === null ? value : (value * (mmPer[unit] as number)) / (mmPer['px'] as number);
}

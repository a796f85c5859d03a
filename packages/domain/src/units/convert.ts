import type { Decimal } from 'decimal.js';
import { InvalidInput } from '../errors/domain-error.ts';
import { Exact } from '../numbers/decimal-text.ts';
import { MM2_PER_FT2 } from './measures.ts';

interface Scale {
  measures: 'area' | 'length';
  /** size in mm or mm², as the fraction per / parts, so that 1/48 in stays exact */
  per: string;
  parts: number;
}

const scales = {
  ft2: { measures: 'area', per: MM2_PER_FT2, parts: 1 },
  dm2: { measures: 'area', per: '10000', parts: 1 },
  m2: { measures: 'area', per: '1000000', parts: 1 },
  mm2: { measures: 'area', per: '1', parts: 1 },
  // Ounce and iron of leather thickness: ASTM D1814-70 (2000) §1.2.
  oz: { measures: 'length', per: '25.4', parts: 64 },
  iron: { measures: 'length', per: '25.4', parts: 48 },
  in: { measures: 'length', per: '25.4', parts: 1 },
  mm: { measures: 'length', per: '1', parts: 1 },
} as const satisfies Record<string, Scale>;

/** ft2, dm2, m2, mm2 for areas; oz (1/64 in), iron (1/48 in), in, mm for lengths. */
export type Unit = keyof typeof scales;

/** Every unit that `convert` knows. */
export const units = Object.keys(scales) as Unit[];

/** Whether a text names a unit that `convert` knows. */
export function isUnit(name: unknown): name is Unit {
  return typeof name === 'string' && Object.hasOwn(scales, name);
}

/**
 * Converts a length or an area; exact up to 40 digits.
 * @throws InvalidInput when an area is asked of a length or the other way round
 */
export function convert(value: Decimal | string | number, from: Unit, to: Unit): Decimal {
  const source: Scale = scales[from];
  const target: Scale = scales[to];
  if (source.measures !== target.measures) {
    throw new InvalidInput(
      'to',
      `${from} measures ${article(source.measures)} and ${to} ${article(target.measures)}: choose two units of the same kind.`,
    );
  }
  return new Exact(value)
    .times(source.per)
    .times(target.parts)
    .div(new Exact(target.per).times(source.parts));
}

const article = (measures: Scale['measures']): string =>
  measures === 'area' ? 'an area' : 'a length';

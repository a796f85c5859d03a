import type { Decimal } from 'decimal.js';

declare const unit: unique symbol;

/** An exact length in millimetres. */
export type Mm = Decimal & { readonly [unit]: 'mm' };
/** An exact area in square millimetres. */
export type Mm2 = Decimal & { readonly [unit]: 'mm2' };
/** An exact area in square feet, the unit leather is sold in. */
export type Ft2 = Decimal & { readonly [unit]: 'ft2' };

/** Says that a decimal is a length in mm. */
export const asMm = (value: Decimal): Mm => value as Mm;
/** Says that a decimal is an area in mm². */
export const asMm2 = (value: Decimal): Mm2 => value as Mm2;
/** Says that a decimal is an area in ft². */
export const asFt2 = (value: Decimal): Ft2 => value as Ft2;

/** 1 ft² in mm²: 304.8², exact since the international foot of 1959. */
export const MM2_PER_FT2 = '92903.04';

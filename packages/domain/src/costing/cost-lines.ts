import type { Decimal } from 'decimal.js';
import { type DecimalText, Exact, toPlaces } from '../numbers/decimal-text.ts';

export type CostKind =
  | 'leather'
  | 'hardware'
  | 'supplies'
  | 'tooling'
  | 'wages'
  | 'desk'
  | 'overhead'
  | 'packing'
  | 'carriage'
  | 'fees';

/** Costs that are hours, or go by the hour: not bought for the run. */
export const hourlyKinds: readonly CostKind[] = ['wages', 'desk', 'overhead'];

export interface CostLine {
  kind: CostKind;
  name: string;
  /** for the whole run, rounded half up once to the currency's decimals */
  amount: DecimalText;
  /** amount over the pieces ordered, 4 places */
  each: DecimalText;
  /** how it was worked out, in words and inputs */
  workings: string;
}

/** Collects the cost lines of one quantity, each rounded once. */
export class CostLines {
  readonly lines: CostLine[] = [];
  readonly #digits: number;
  readonly #quantity: number;

  constructor(digits: number, quantity: number) {
    this.#digits = digits;
    this.#quantity = quantity;
  }

  /** The one place where a cost is rounded. */
  add(kind: CostKind, name: string, exact: Decimal, workings: string): void {
    const amount = toPlaces(exact, this.#digits);
    const each = toPlaces(new Exact(amount).div(this.#quantity), 4);
    this.lines.push({ kind, name, amount, each, workings });
  }
}

/** The sum of the cost lines that are asked for. */
export function sumOf(lines: readonly CostLine[], wanted: (kind: CostKind) => boolean): Decimal {
  return lines
    .filter(({ kind }) => wanted(kind))
    .reduce((sum, { amount }) => sum.plus(amount), new Exact(0) as Decimal);
}

/** All kinds but the given ones. */
export const isNot =
  (...kinds: readonly CostKind[]) =>
  (kind: CostKind): boolean =>
    !kinds.includes(kind);

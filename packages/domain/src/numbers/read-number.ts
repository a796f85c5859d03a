import { InvalidInput } from '../errors/domain-error.ts';

export interface NumberLimits {
  min?: number;
  max?: number;
  /** the value must be larger than this, not equal to it */
  above?: number;
  /** the value must be smaller than this, not equal to it */
  below?: number;
}

/** Beyond this, sums and squares of what a workshop counts mean nothing. */
const largest = 1e12;

/** Refuses anything but a finite number within the limits, up to 10^12. @throws InvalidInput */
export function readNumber(value: unknown, field: string, limits: NumberLimits = {}): number {
  const { min = -largest, max = largest, above = -Infinity, below = Infinity } = limits;
  if (
    typeof value !== 'number' ||
    !Number.isFinite(value) ||
    value < min ||
    value > max ||
    value <= above ||
    value >= below
  ) {
    throw new InvalidInput(field, `Write ${field} as a number ${inWords(limits)}.`);
  }
  return value;
}

function inWords({ min, max = largest, above, below }: NumberLimits): string {
  const low = above === undefined ? `from ${min ?? -largest}` : `above ${above}`;
  return `${low} ${below === undefined ? `up to ${max}` : `and below ${below}`}`;
}

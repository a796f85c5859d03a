import { type DecimalText, Exact } from '../numbers/decimal-text.ts';

/** What a leather is bought as: a side of about so much. */
export interface Whole {
  form: string;
  areaMm2: DecimalText;
}

/** How many of them. */
export interface Wholes {
  count: number;
  form: string;
}

/** How many whole sides or hides an area is; null where it is not known what it is bought as, or they do not come out even. */
export function wholesOf(whole: Whole | null, areaMm2: DecimalText): Wholes | null {
  if (whole === null || !new Exact(areaMm2).mod(whole.areaMm2).isZero()) return null;
  return { count: new Exact(areaMm2).div(whole.areaMm2).toNumber(), form: whole.form };
}

/** "side", "hides", "bellies". */
export function wholes({ count, form }: Wholes): string {
  if (count === 1) return form;
  return form.endsWith('y') ? `${form.slice(0, -1)}ies` : `${form}s`;
}

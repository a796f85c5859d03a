import { unscaled } from '../../db/columns/scaled-decimal.ts';
import { moneyText } from '../../http/decimal-text.ts';

export interface AskedPage {
  below: number | undefined;
  limit: number;
  q: string | undefined;
}

export const moneyOf = (hundredths: number): string => moneyText(unscaled(hundredths, 2));

/** An issued invoice keeps the name it was issued to. */
export const customerName = `coalesce(json_extract(invoice.snapshot, '$.billedTo.name'), customer.name)`;

/** The conditions of a page: rows below a cursor whose words hold what is looked for. */
export function matching(
  id: string,
  words: string,
  asked: AskedPage,
): { where: string[]; params: unknown[] } {
  const where = ['1 = 1'];
  const params: unknown[] = [];
  if (asked.below !== undefined) {
    where.push(`${id} < ?`);
    params.push(asked.below);
  }
  if (asked.q !== undefined && asked.q !== '') {
    where.push(`instr(lower(concat_ws(' ', ${words})), lower(?)) > 0`);
    params.push(asked.q);
  }
  return { where, params };
}

const thousands = /^\d{1,3}(,\d{3})+$/;
const eitherWay = /^[1-9]\d{0,2},\d{3}(?!\d)/;

/** A whole number with or without commas between its thousands (1,250), without them; undefined where it is none. */
export function readWhole(text: string): string | undefined {
  const plain = text.trim();
  if (/^\d+$/.test(plain)) return plain;
  return thousands.test(plain) ? plain.replaceAll(',', '') : undefined;
}

/**
 * With a point where a comma stood before decimals (24,75). A comma before exactly three digits (1,250) may mean
 * either and is left, so that nobody reads it as a number.
 */
export function withPoint(text: string): string {
  const plain = text.trim();
  return eitherWay.test(plain) ? plain : plain.replace(',', '.');
}

/** What to write instead of a figure whose comma may mean either; undefined where it is clear. */
export function unclearComma(text: string): string | undefined {
  const [plain] = eitherWay.exec(text.trim()) ?? [];
  if (plain === undefined) return undefined;
  const decimal = plain.replace(',', '.').replace(/\.?0+$/, '');
  return `Write ${plain.replace(',', '')} or ${decimal}: ${plain} may mean either.`;
}

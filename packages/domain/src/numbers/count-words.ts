/** A whole number in a sentence, its thousands set apart: 39400 → 39,400. */
export function countWords(count: number | string): string {
  return String(count).replace(/\B(?=(\d{3})+$)/g, ',');
}

/** A figure that may have decimals, the same: 1250.50 → 1,250.50. */
export function figureWords(figure: string): string {
  const [whole = '', decimals] = figure.split('.');
  return decimals === undefined ? countWords(whole) : `${countWords(whole)}.${decimals}`;
}

/** A whole number in a sentence, its thousands set apart: 39400 → 39,400. */
export function countWords(count: number | string): string {
  return String(count).replace(/\B(?=(\d{3})+$)/g, ',');
}

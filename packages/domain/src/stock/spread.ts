/** Mean and standard deviation (of a sample, n − 1) of some figures; both 0 where there are none. */
export function meanAndSpread(figures: readonly number[]): { mean: number; sd: number } {
  if (figures.length === 0) return { mean: 0, sd: 0 };
  const mean = figures.reduce((sum, each) => sum + each, 0) / figures.length;
  if (figures.length === 1) return { mean, sd: 0 };
  const squares = figures.reduce((sum, each) => sum + (each - mean) ** 2, 0);
  return { mean, sd: Math.sqrt(squares / (figures.length - 1)) };
}

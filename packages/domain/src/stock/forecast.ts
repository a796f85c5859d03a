import { InvalidInput } from '../errors/domain-error.ts';
import { readNumber } from '../numbers/read-number.ts';

/**
 * Next period's use by exponential smoothing: from the forecast `first` for the first period on,
 * each use moves the forecast by the share `alpha` of what it was off by.
 * @param series use per period, oldest first; 0 or more
 * @param alpha above 0, up to 1
 * @throws InvalidInput
 */
export function smoothedUse(series: readonly number[], alpha: number, first: number): number {
  checkSeries(series, alpha);
  return smooth(series, alpha, readNumber(first, 'first', { min: 0 }));
}

export interface CrostonForecast {
  /** smoothed use in a period that has any */
  size: number;
  /** smoothed count of periods from one use to the next */
  interval: number;
  /** size / interval: use per period */
  forecast: number;
}

/**
 * Use per period of what is rarely used (Croston, Operational Research Quarterly 23, 1972; from
 * memory): sizes and intervals are smoothed by themselves. Begins with the first use and with the
 * periods up to it, counted from the start of the series.
 * Where nothing was ever used, nothing is expected, and the interval is as long as the series (a
 * forecast of 0 as R's forecast::croston gives it, from memory).
 * @param series use per period, oldest first; 0 or more
 * @param alpha above 0, up to 1
 * @throws InvalidInput
 */
export function crostonForecast(series: readonly number[], alpha: number): CrostonForecast {
  checkSeries(series, alpha);
  const used = series.flatMap((use, at) => (use > 0 ? [{ use, period: at + 1 }] : []));
  const sizes = used.map(({ use }) => use);
  const intervals = used.map(({ period }, at) => period - (used[at - 1]?.period ?? 0));
  const [firstSize, firstInterval] = [sizes[0], intervals[0]];
  if (firstSize === undefined || firstInterval === undefined) {
    return { size: 0, interval: series.length, forecast: 0 };
  }
  const size = smooth(sizes, alpha, firstSize);
  const interval = smooth(intervals, alpha, firstInterval);
  return { size, interval, forecast: size / interval };
}

function checkSeries(series: readonly number[], alpha: number): void {
  readNumber(alpha, 'alpha', { above: 0, max: 1 });
  if (series.length === 0) throw new InvalidInput('series', 'Give the use of at least one period.');
  series.forEach((use, at) => readNumber(use, `series.${at}`, { min: 0 }));
}

const smooth = (series: readonly number[], alpha: number, first: number): number =>
  series.reduce((forecast, use) => alpha * use + (1 - alpha) * forecast, first);

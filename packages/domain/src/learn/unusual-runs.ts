/** One run as others look at it; null where it was not logged. */
export interface LookedAt {
  minutesPer100: number | null;
  rejected: number | null;
  /** pieces that were cut */
  reached: number;
}

/** Why a run looks unlike the others. */
export type Unusual = 'slow' | 'quick' | 'many rejects';

/** Below so many other runs their spread says too little. */
const enoughOthers = 4;

/**
 * Which runs look unlike the rest, one entry per run. Minutes per 100 are unusual at more than twice or
 * less than half the median of all (from three runs on), or beyond 3 standard deviations of the
 * other runs (from five runs on; a run judged by a spread that it made itself would never stand
 * out). Rejects are unusual beyond 3 standard deviations √(np(1 − p)) above np, with the rate p of the
 * other runs. Such a run is only named: whether it counts is for a person to say.
 */
export function unusualRuns(runs: readonly LookedAt[]): (Unusual | null)[] {
  return runs.map((run, at) => {
    const others = runs.filter((_, other) => other !== at);
    return unusualTime(run, others, runs) ?? (manyRejects(run, others) ? 'many rejects' : null);
  });
}

function unusualTime(
  { minutesPer100: value }: LookedAt,
  others: readonly LookedAt[],
  all: readonly LookedAt[],
): Unusual | null {
  if (value === null) return null;
  const times = timesOf(all);
  const middle = medianOf(times);
  if (times.length >= 3 && value > 2 * middle) return 'slow';
  if (times.length >= 3 && value < middle / 2) return 'quick';
  const rest = timesOf(others);
  if (rest.length < enoughOthers) return null;
  const mean = meanOf(rest);
  const sd = Math.sqrt(meanOf(rest.map((each) => (each - mean) ** 2)) * bessel(rest.length));
  if (sd === 0 || Math.abs(value - mean) <= 3 * sd) return null;
  return value > mean ? 'slow' : 'quick';
}

function manyRejects(run: LookedAt, others: readonly LookedAt[]): boolean {
  if (run.rejected === null) return false;
  const counted = others.filter(({ rejected }) => rejected !== null);
  const reached = counted.reduce((sum, each) => sum + each.reached, 0);
  const rejected = counted.reduce((sum, each) => sum + (each.rejected ?? 0), 0);
  if (counted.length < 2 || reached === 0 || rejected === 0) return false;
  const p = rejected / reached;
  return run.rejected > run.reached * p + 3 * Math.sqrt(run.reached * p * (1 - p));
}

const timesOf = (runs: readonly LookedAt[]): number[] =>
  runs.flatMap(({ minutesPer100 }) => (minutesPer100 === null ? [] : [minutesPer100]));

const meanOf = (values: readonly number[]): number =>
  values.reduce((sum, value) => sum + value, 0) / values.length;

const bessel = (n: number): number => n / (n - 1);

function medianOf(values: readonly number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  const middle = Math.floor(sorted.length / 2);
  const [low, high] = [sorted[middle - 1] ?? 0, sorted[middle] ?? 0];
  return sorted.length % 2 === 1 ? high : (low + high) / 2;
}

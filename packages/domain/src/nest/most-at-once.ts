/**
 * After each start one more, past each end one fewer: the most at once among the places from 0 to 1,
 * and one such place, as far from the next change as it can be. Both lists rise.
 */
export function mostAtOnce(starts: Float64Array, ends: Float64Array): { gain: number; u: number } {
  let [gain, best, u] = [0, 0, Math.min(1, ends[0] ?? 1, starts[0] ?? 1) / 2];
  let passed = 0;
  for (let at = 0; at < starts.length; at += 1) {
    const start = starts[at] as number;
    while (passed < ends.length && (ends[passed] as number) < start) {
      passed += 1;
      gain -= 1;
    }
    gain += 1;
    if (gain > best) {
      best = gain;
      u = (start + Math.max(start, Math.min(ends[passed] ?? 1, starts[at + 1] ?? 1))) / 2;
    }
  }
  return { gain: best, u };
}

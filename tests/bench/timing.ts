/** The middle of so many runs' times, in ms, and what the last run gave. */
export function medianMs<T>(runs: number, run: () => T): { ms: number; result: T } {
  const times: number[] = [];
  let result: T;
  do {
    const began = performance.now();
    result = run();
    times.push(performance.now() - began);
  } while (times.length < runs);
  times.sort((a, b) => a - b);
  return { ms: times[Math.floor(times.length / 2)] ?? 0, result };
}

/** A fixed loop of arithmetic on this machine: other times are compared with it. */
export function calibrationMs(): number {
  return medianMs(5, () => {
    let [sum, state] = [0, 1];
    for (let turn = 0; turn < 2_000_000; turn += 1) {
      state = (state * 48271) % 2147483647;
      sum += Math.sqrt(state);
    }
    return sum;
  }).ms;
}

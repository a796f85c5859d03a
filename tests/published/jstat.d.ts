declare module 'jstat' {
  const jstat: {
    binomial: { cdf: (successes: number, trials: number, rate: number) => number };
    normal: { inv: (share: number, mean: number, sd: number) => number };
    beta: { inv: (share: number, alpha: number, beta: number) => number };
  };
  export = jstat;
}

declare module 'jstat' {
  const jstat: {
    binomial: { cdf: (successes: number, trials: number, rate: number) => number };
  };
  export = jstat;
}

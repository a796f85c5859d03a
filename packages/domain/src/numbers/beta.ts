const tiny = 1e-300;

/** ln Γ(x) for x > 0: Stirling's series, after Γ(x) = Γ(x + 1) / x has brought x up to 20. */
function logGamma(x: number): number {
  let [at, shift] = [x, 0];
  for (; at < 20; at += 1) shift += Math.log(at);
  const square = at * at;
  const series = (1 / 12 - (1 / 360 - (1 / 1260 - 1 / (1680 * square)) / square) / square) / at;
  return (at - 0.5) * Math.log(at) - at + Math.log(2 * Math.PI) / 2 + series - shift;
}

/**
 * I_x(a, b), the chance that a Beta(a, b) value lies below x: the continued fraction of DLMF 8.17.22
 * (from memory), used on the side where it converges quickly. To about 11 digits for a and b of some
 * thousands, where the logarithms of the gamma function cancel.
 * @param a above 0
 * @param b above 0
 * @param x from 0 to 1
 */
export function betaBelow(x: number, a: number, b: number): number {
  if (x <= 0) return 0;
  if (x >= 1) return 1;
  if (x > (a + 1) / (a + b + 2)) return 1 - betaBelow(1 - x, b, a);
  const logFront = a * Math.log(x) + b * Math.log1p(-x) - logBeta(a, b);
  return (Math.exp(logFront) / a) * betaFraction(x, a, b);
}

const logBeta = (a: number, b: number): number => logGamma(a) + logGamma(b) - logGamma(a + b);

/** 1 / (1 + d₁/(1 + d₂/(1 + …))) from the front, by the method of Lentz. */
function betaFraction(x: number, a: number, b: number): number {
  let [top, bottom, value] = [1, 1 / (1 + coefficient(1, x, a, b) || tiny), 1];
  value = bottom;
  for (let k = 2; k < 1_000_000; k += 1) {
    const d = coefficient(k, x, a, b);
    bottom = 1 / (1 + d * bottom || tiny);
    top = 1 + d / top || tiny;
    value *= top * bottom;
    if (Math.abs(top * bottom - 1) < 1e-16) break;
  }
  return value;
}

function coefficient(k: number, x: number, a: number, b: number): number {
  const m = Math.floor(k / 2);
  return k % 2 === 0
    ? (m * (b - m) * x) / ((a + k - 1) * (a + k))
    : (-(a + m) * (a + b + m) * x) / ((a + k - 1) * (a + k));
}

/** x with I_x(a, b) = share, by halving; `share` lies between 0 and 1. */
export function betaQuantile(share: number, a: number, b: number): number {
  let [low, high] = [0, 1];
  for (let step = 0; step < 200; step += 1) {
    const middle = (low + high) / 2;
    if (middle === low || middle === high) break;
    if (betaBelow(middle, a, b) < share) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

import { readNumber } from './read-number.ts';

/** Beyond it the series loses digits and the continued fraction is quick. */
const tailFrom = 3;

/** φ(z), the density of the standard normal distribution. */
function normalDensity(z: number): number {
  return Math.exp(-(z * z) / 2) / Math.sqrt(2 * Math.PI);
}

/**
 * 1 − Φ(z), the chance that a standard normal value lies above z. Near the middle
 * Φ(z) = 1/2 + φ(z) (z + z³/3 + z⁵/(3·5) + …), in the tail Laplace's continued fraction
 * φ(z) / (z + 1/(z + 2/(z + 3/(z + …)))); both from memory (Abramowitz and Stegun 26.2.11, 26.2.14).
 */
export function normalAbove(z: number): number {
  return z < 0 ? 1 - normalAbove(-z) : millsRatio(z) * normalDensity(z);
}

/** (1 − Φ(z)) / φ(z) for z ≥ 0: never too small for a floating point number. */
function millsRatio(z: number): number {
  return z < tailFrom ? 0.5 / normalDensity(z) - middleSeries(z) : 1 / fraction(z);
}

function middleSeries(z: number): number {
  let term = z;
  let sum = z;
  for (let odd = 3; sum + term !== sum; odd += 2) {
    term *= (z * z) / odd;
    sum += term;
  }
  return sum;
}

function fraction(z: number): number {
  let below = z;
  for (let depth = 200; depth >= 1; depth -= 1) below = z + depth / below;
  return below;
}

/**
 * z with Φ(z) = share: the normal quantile, to about 14 digits. Newton's method on the logarithm of
 * the tail, which is concave: from above the answer, since 1 − Φ(z) < e^(−z²/2) / 2, every step
 * comes closer from the same side.
 * @param share above 0, below 1
 * @throws InvalidInput
 */
export function normalQuantile(share: number, field = 'share'): number {
  readNumber(share, field, { above: 0, below: 1 });
  const logTail = Math.log(Math.min(share, 1 - share));
  let z = Math.sqrt(Math.max(0, -2 * (logTail + Math.LN2)));
  for (let step = 0; step < 100; step += 1) {
    const mills = millsRatio(z);
    const logAbove = Math.log(mills) - (z * z + Math.log(2 * Math.PI)) / 2;
    const change = (logAbove - logTail) * mills;
    z += change;
    if (Math.abs(change) < 1e-15 * (1 + z)) break;
  }
  return share < 0.5 ? -z : z;
}

/**
 * G(z) = φ(z) − z (1 − Φ(z)): how many standard deviations of demand are missed on average by a
 * stock of mean + z deviations (the unit normal loss function).
 */
export function normalLoss(z: number): number {
  return normalDensity(z) - z * normalAbove(z);
}

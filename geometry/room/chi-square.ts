/** Lanczos coefficients, g = 7, n = 9 (Press et al., Numerical Recipes, 3rd ed., sec. 6.1 gives the method). */
const LANCZOS = [
  0.99999999999980993, 676.5203681218851, -1259.1392167224028, 771.32342877765313, -176.61502916214059,
  12.507343278686905, -0.13857109526572012, 9.9843695780195716e-6, 1.5056327351493116e-7,
] as const;

/** Relative accuracy asked of series and Newton steps; far under anything printed. */
const PRECISION = 1e-15;
const MAX_TERMS = 1000;

/**
 * The value that a chi-square sum of `dof` spare readings stays under with the given probability.
 *
 * @param probability - between 0 and 1, both excluded
 * @param dof - degrees of freedom, a positive integer
 * @throws RangeError outside these
 * @see Abramowitz & Stegun 26.4.17 (Wilson-Hilferty) for the start, 6.5 for the incomplete gamma function
 */
export function chiSquareQuantile(probability: number, dof: number): number {
  if (!(probability > 0 && probability < 1)) throw new RangeError(`probability must be in (0, 1), got ${probability}`);
  if (!(dof > 0)) throw new RangeError(`degrees of freedom must be over 0, got ${dof}`);
  const a = dof / 2;
  const spread = 2 / (9 * dof);
  const cube = 1 - spread + roughNormalQuantile(probability) * Math.sqrt(spread);
  let x = Math.max(dof * cube ** 3, 1e-8) / 2;
  for (let i = 0; i < 50; i++) {
    const density = Math.exp((a - 1) * Math.log(x) - x - logGamma(a));
    const step = (lowerGamma(a, x) - probability) / density;
    // Near 0 the density explodes and a full step may leave the axis.
    const next = x - step > 0 ? x - step : x / 2;
    if (Math.abs(next - x) <= PRECISION * 10 * x) return 2 * next;
    x = next;
  }
  return 2 * x;
}

/** Probability that a chi-square sum of `dof` spare readings stays under `value`. */
export function chiSquareProbability(value: number, dof: number): number {
  if (!(dof > 0)) throw new RangeError(`degrees of freedom must be over 0, got ${dof}`);
  return value <= 0 ? 0 : lowerGamma(dof / 2, value / 2);
}

/** Regularised lower incomplete gamma function. */
function lowerGamma(a: number, x: number): number {
  const front = Math.exp(a * Math.log(x) - x - logGamma(a));
  if (x < a + 1) {
    let term = 1 / a;
    let sum = term;
    for (let n = 1; n < MAX_TERMS && term > PRECISION * sum; n++) {
      term *= x / (a + n);
      sum += term;
    }
    return front * sum;
  }
  // Modified Lentz continued fraction of the upper function.
  let b = x + 1 - a;
  let c = 1 / Number.MIN_VALUE;
  let d = 1 / b;
  let fraction = d;
  for (let n = 1; n < MAX_TERMS; n++) {
    const numerator = -n * (n - a);
    b += 2;
    d = 1 / (numerator * d + b);
    c = b + numerator / c;
    fraction *= c * d;
    if (Math.abs(c * d - 1) < PRECISION) break;
  }
  return 1 - front * fraction;
}

function logGamma(z: number): number {
  if (z < 0.5) return Math.log(Math.PI / Math.sin(Math.PI * z)) - logGamma(1 - z);
  const x = z - 1;
  let sum: number = LANCZOS[0];
  for (let i = 1; i < LANCZOS.length; i++) sum += LANCZOS[i]! / (x + i);
  const t = x + 7.5;
  return 0.5 * Math.log(2 * Math.PI) + (x + 0.5) * Math.log(t) - t + Math.log(sum);
}

/** Normal quantile to 4.5e-4, good enough as a start (Abramowitz & Stegun 26.2.23). */
function roughNormalQuantile(p: number): number {
  const tail = Math.min(p, 1 - p);
  const t = Math.sqrt(-2 * Math.log(tail));
  const size = t - (2.515517 + t * (0.802853 + t * 0.010328)) / (1 + t * (1.432788 + t * (0.189269 + t * 0.001308)));
  return p < 0.5 ? -size : size;
}

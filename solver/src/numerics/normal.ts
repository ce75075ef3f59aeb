/*
 * The normal distribution with mean 0 and standard deviation 1.
 */

/** Φ(x), the share below x, to about 1e-13 relative also far below 0. */
export function normalShare(x: number): number {
  return x < 0 ? tail(-x) : 1 - tail(x);
}

/** x with Φ(x) = share; −∞ at 0 and ∞ at 1. Accurate to about 1e-13 relative. */
export function normalQuantile(share: number): number {
  if (share <= 0) return -Infinity;
  if (share >= 1) return Infinity;
  return share < 0.5 ? -tailQuantile(share) : tailQuantile(1 - share);
}

/** 1 − Φ(x) for x ≥ 0: by the series of Φ below 2.5, by Laplace's continued fraction above. */
function tail(x: number): number {
  const density = Math.exp((-x * x) / 2) / Math.sqrt(2 * Math.PI);
  return x < 2.5 ? 0.5 - density * series(x) : density / fraction(x);
}

/** x + x³/3 + x⁵/(3·5) + … */
function series(x: number): number {
  let term = x;
  let sum = x;
  for (let n = 3; term > 1e-17 * sum; n += 2) {
    term *= (x * x) / n;
    sum += term;
  }
  return sum;
}

/** x + 1/(x + 2/(x + 3/(x + …))), from far enough inside for doubles at x ≥ 2.5. */
function fraction(x: number): number {
  let value = x;
  for (let n = 120; n > 0; n--) value = x + n / value;
  return value;
}

/**
 * x ≥ 0 with 1 − Φ(x) = share, share ≤ 1/2: a rational approximation to 4.5e-4 (Hastings 1955, as in Abramowitz & Stegun
 * 26.2.23), polished three times by Halley's method.
 */
function tailQuantile(share: number): number {
  const t = Math.sqrt(-2 * Math.log(share));
  let x = t - (2.515517 + t * (0.802853 + t * 0.010328)) / (1 + t * (1.432788 + t * (0.189269 + t * 0.001308)));
  x = Math.max(0, x);
  for (let i = 0; i < 3; i++) {
    const step = ((tail(x) - share) * Math.sqrt(2 * Math.PI)) / Math.exp((-x * x) / 2);
    x += step / (1 - (x * step) / 2);
  }
  return x;
}

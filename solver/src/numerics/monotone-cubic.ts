/** A curve through given points: its value and slope at any x. */
export interface Curve {
  readonly value: (x: number) => number;
  readonly slope: (x: number) => number;
}

/**
 * The monotone piecewise cubic y(x) through (x_i, y_i): it never overshoots between two points.
 *
 * Node slopes are the mean of the two secants, 0 where these differ in sign or one is 0; end slopes the end secant; where
 * α² + β² > 9 (node slopes over the interval's secant) both are scaled by 3/√(α² + β²), interval by interval from the left.
 * @param xs strictly rising, at least one. @param ys as many. Outside [x_0, x_n] the end values are held, with slope 0; at
 * a node the slope is the right-hand one, so 0 at the last.
 * Source: Fritsch & Carlson 1980, SIAM J. Numer. Anal. 17:238 (not held).
 */
export function monotoneCubic(xs: readonly number[], ys: readonly number[]): Curve {
  const last = xs.length - 1;
  const secants = xs.slice(1).map((x, i) => (ys[i + 1] - ys[i]) / (x - xs[i]));
  const slopes = limited(nodeSlopes(secants), secants);
  const bends = secants.map((secant, i) => slopes[i] + slopes[i + 1] - 2 * secant);
  return {
    value(x) {
      if (x <= xs[0]) return ys[0];
      if (x >= xs[last]) return ys[last];
      const i = intervalOf(xs, x);
      const width = xs[i + 1] - xs[i];
      const s = (x - xs[i]) / width;
      return ys[i] + width * s * (slopes[i] + s * (secants[i] - slopes[i] + (s - 1) * bends[i]));
    },
    slope(x) {
      if (x < xs[0] || x >= xs[last]) return 0;
      const i = intervalOf(xs, x);
      const s = (x - xs[i]) / (xs[i + 1] - xs[i]);
      return slopes[i] + s * (2 * (secants[i] - slopes[i]) + (3 * s - 2) * bends[i]);
    },
  };
}

function nodeSlopes(secants: readonly number[]): number[] {
  if (secants.length === 0) return [0];
  const inner = secants.slice(1).map((secant, i) => (secant * secants[i] > 0 ? (secant + secants[i]) / 2 : 0));
  return [secants[0], ...inner, secants[secants.length - 1]];
}

function limited(slopes: number[], secants: readonly number[]): number[] {
  secants.forEach((secant, i) => {
    const steepness = Math.hypot(slopes[i] / secant, slopes[i + 1] / secant);
    // A flat interval has 0/0 here: NaN compares false, and its slopes are 0 already.
    if (!(steepness > 3)) return;
    slopes[i] *= 3 / steepness;
    slopes[i + 1] *= 3 / steepness;
  });
  return slopes;
}

/** i with xs[i] ≤ x < xs[i + 1], for x inside the range. */
function intervalOf(xs: readonly number[], x: number): number {
  let [low, high] = [0, xs.length - 1];
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (xs[middle] <= x) low = middle;
    else high = middle;
  }
  return low;
}

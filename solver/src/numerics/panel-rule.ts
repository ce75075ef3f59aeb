/**
 * What a smooth function is told by over one panel, in u from −1 to 1: both ends and between them the n nodes of Gauss and
 * Legendre, for the integral (exact for polynomials of degree 2n − 1) and for the polynomial through all of them.
 *
 * Sources: Gauss–Legendre as in Abramowitz & Stegun (1964), 25.4.29; the barycentric formula as in J.-P. Berrut & L. N.
 * Trefethen, SIAM Review 46 (2004) 501 (both from memory).
 */
export class PanelRule {
  /** u of the ends and nodes, rising. */
  readonly nodes: Float64Array;
  /** Weights of the integral over u; 0 at the ends. */
  readonly weights: Float64Array;
  private readonly barycentric: Float64Array;
  /** What each value adds to the slope at u = −1. */
  private readonly slopes: Float64Array;

  constructor(count: number) {
    const roots = legendreRoots(count);
    this.nodes = Float64Array.from([-1, ...roots, 1]);
    this.weights = Float64Array.from([0, ...roots.map((x) => weightAt(x, count)), 0]);
    this.barycentric = this.nodes.map((u) => 1 / this.nodes.reduce((product, other) => product * (u - other || 1), 1));
    this.slopes = this.nodes.map((u, i) => (i === 0 ? 0 : this.barycentric[i] / this.barycentric[0] / (-1 - u)));
    this.slopes[0] = -this.slopes.reduce((sum, share) => sum + share, 0);
  }

  /** The polynomial through the values at the nodes, at u. */
  interpolate(values: ArrayLike<number>, u: number): number {
    const { nodes, barycentric } = this;
    let over = 0;
    let under = 0;
    for (let i = 0; i < nodes.length; i++) {
      const apart = u - nodes[i];
      if (apart === 0) return values[i];
      const share = barycentric[i] / apart;
      over += share * values[i];
      under += share;
    }
    return over / under;
  }

  /** Its slope at u = −1, or +1, per unit of u. */
  slopeAtEnd(values: ArrayLike<number>, end: -1 | 1): number {
    // nodes and weights lie alike on both sides: one row of the differentiation matrix serves both ends
    const { slopes } = this;
    const last = slopes.length - 1;
    let sum = 0;
    for (let i = 0; i <= last; i++) sum += slopes[i] * values[end < 0 ? i : last - i];
    return -end * sum;
  }

  /**
   * Where it has its top (or bottom) between a and b, by Newton's method on differences from u on; where it is led out, it
   * stays at the edge.
   */
  top(values: ArrayLike<number>, from: number, a: number, b: number, isTop: boolean): number {
    const apart = 1e-3;
    let u = from;
    for (let i = 0; i < 8; i++) {
      const here = this.interpolate(values, u);
      const before = this.interpolate(values, u - apart);
      const after = this.interpolate(values, u + apart);
      const bend = before - 2 * here + after;
      if (isTop ? !(bend < 0) : !(bend > 0)) return u;
      const step = (apart * (before - after)) / (2 * bend);
      u = Math.min(b, Math.max(a, u + step));
      if (Math.abs(step) < 1e-5) return u;
    }
    return u;
  }
}

/** Where the parabola through nodes n − 1, n, n + 1 has its top or bottom; NaN where it is a line. */
export function vertex(nodes: ArrayLike<number>, values: ArrayLike<number>, n: number): number {
  const left = nodes[n] - nodes[n - 1];
  const right = nodes[n] - nodes[n + 1];
  const r = left * (values[n] - values[n + 1]);
  const q = right * (values[n] - values[n - 1]);
  return nodes[n] - (0.5 * (left * r - right * q)) / (r - q);
}

const rules = [3, 4, 6, 8, 10].map((count) => new PanelRule(count));
/** The widest panel each rule is for, rad. */
const widths = [0.03, 0.1, 0.5, 1.2];
export const widestPanel = 3.2;

/**
 * The rule for a panel over which the fastest rate turns by so many radians, at most `widestPanel`: the integral of a
 * product of two such functions is then right to about 1e-13 of its size (by the rule's remainder, 25.4.30 of the same
 * book), the polynomial through the nodes to 1e-9.
 */
export function ruleFor(radians: number): PanelRule {
  const i = widths.findIndex((width) => radians <= width);
  return rules[i < 0 ? rules.length - 1 : i];
}

/** Legendre's polynomial of degree n and its derivative at x, by their recurrence. */
function legendre(n: number, x: number): [number, number] {
  let [before, value] = [1, x];
  for (let k = 2; k <= n; k++) [before, value] = [value, ((2 * k - 1) * x * value - (k - 1) * before) / k];
  return [value, (n * (before - x * value)) / (1 - x * x)];
}

/** Its roots, rising, by Newton's method from the usual estimate. */
function legendreRoots(n: number): number[] {
  return Array.from({ length: n }, (_, i) => {
    let x = -Math.cos((Math.PI * (i + 0.75)) / (n + 0.5));
    for (let step = 0; step < 8; step++) {
      const [value, slope] = legendre(n, x);
      x -= value / slope;
    }
    return x;
  });
}

function weightAt(x: number, n: number): number {
  const [, slope] = legendre(n, x);
  return 2 / ((1 - x * x) * slope * slope);
}

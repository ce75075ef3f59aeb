/**
 * A step h ≤ span with w + w'h + w''h²/2 − Mh³/6 > 0 on (0, h), for w ≥ 0 (see `first-zero.ts`). From w = 0 it is that
 * cubic's own root. Else, on (0, H), the cubic is at least the parabola with curvature w'' − MH/3, whose root is a safe
 * step; a smaller H makes that parabola tighter.
 *
 * Its numbers go in and out by fields: a hot loop that passed them as arguments would allocate each of them.
 */
export class SafeStep {
  /** w, w', w'' and M. */
  value = 0;
  first = 0;
  second = 0;
  bound = 0;
  span = 0;
  /** h, filled in by `find`. */
  step = 0;

  find(): void {
    const { value, first, second, bound, span } = this;
    if (value === 0) return this.fromZero();
    // the cubic's root is no farther than this, each term on its own being outweighed
    let stretch = Math.cbrt((6 * value) / bound);
    if (first > 0) stretch += Math.sqrt((6 * first) / bound);
    if (second > 0) stretch += (3 * second) / bound;
    if (!(stretch < span)) stretch = span;
    let safe = 0;
    for (let i = 0; i < 4; i++) {
      const root = firstRoot(value, first, second / 2 - (bound * stretch) / 6);
      if (root >= stretch) {
        this.step = stretch;
        return;
      }
      const isEnough = root < 1.05 * safe;
      if (root > safe) safe = root;
      if (isEnough) break;
      if (root * 1.7 < stretch) stretch = root * 1.7;
    }
    this.step = safe;
  }

  /** The positive root of w' + w''h/2 − Mh²/6, without cancellation; 0 where w' < 0 or w falls at once. */
  private fromZero(): void {
    const { first, bound, span } = this;
    const kappa = this.second / 2;
    this.step = 0;
    if (first < 0 || (first === 0 && !(kappa > 0))) return;
    const root = Math.sqrt(kappa * kappa + (2 * bound * first) / 3);
    if (kappa < 0) this.step = (2 * first) / (root - kappa);
    else this.step = bound > 0 ? (2.999 * (kappa + root)) / bound : span;
    if (this.step > span) this.step = span;
  }
}

/** The first positive zero of w + w'h + κh² for w ≥ 0 (h = 0 not counted), without cancellation; Infinity without one. */
export function firstRoot(value: number, first: number, kappa: number): number {
  const square = first * first - 4 * kappa * value;
  if (square < 0) return Infinity;
  if (first < 0) return (2 * value) / (-first + Math.sqrt(square));
  return kappa < 0 ? (first + Math.sqrt(square)) / (-2 * kappa) : Infinity;
}

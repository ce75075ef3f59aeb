const golden = (3 - Math.sqrt(5)) / 2;

/**
 * The largest value of f on [a, b], f(m) with a < m < b being at least f(a) and f(b): Brent's method (R. P. Brent,
 * Algorithms for Minimization without Derivatives, 1973, ch. 5). The place is found to about 1e-8 of the bracket, the
 * value therefore to rounding.
 */
export function peak(f: (x: number) => number, a: number, m: number, b: number, fm: number): number {
  let x = m;
  let w = m;
  let v = m;
  let fx = fm;
  let fw = fm;
  let fv = fm;
  let last = 0;
  let step = 0;
  for (let i = 0; i < 60; i++) {
    const middle = (a + b) / 2;
    const tolerance = 1e-9 * (b - a) + 2 ** -51 * Math.abs(x);
    if (Math.abs(x - middle) <= 2 * tolerance - (b - a) / 2 || b - a <= 4 * tolerance) break;
    const parabolic = parabolicStep(x, w, v, fx, fw, fv);
    const isUsable = Math.abs(parabolic) < Math.abs(last) / 2 && x + parabolic > a && x + parabolic < b;
    if (i > 1 && isUsable) {
      last = step;
      step = parabolic;
    } else {
      last = x < middle ? b - x : a - x;
      step = golden * last;
    }
    if (Math.abs(step) < 1e-8 * Math.abs(last) && i > 6) break;
    const u = x + step;
    const fu = f(u);
    if (fu >= fx) {
      if (u >= x) a = x;
      else b = x;
      [v, w, x] = [w, x, u];
      [fv, fw, fx] = [fw, fx, fu];
    } else {
      if (u < x) a = u;
      else b = u;
      if (fu >= fw || w === x) {
        [v, w] = [w, u];
        [fv, fw] = [fw, fu];
      } else if (fu >= fv || v === x || v === w) {
        v = u;
        fv = fu;
      }
    }
    if (i > 3 && fx - Math.max(fw, fv) <= 2 ** -53 * Math.abs(fx) && Math.abs(step) < 1e-4 * (b - a + Math.abs(step)))
      break;
  }
  return fx;
}

/** The step from x to the top of the parabola through three points; NaN where there is none. */
function parabolicStep(x: number, w: number, v: number, fx: number, fw: number, fv: number): number {
  const r = (x - w) * (fx - fv);
  const q = (x - v) * (fx - fw);
  return (0.5 * ((x - v) * q - (x - w) * r)) / (r - q);
}

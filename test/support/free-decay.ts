/** A free body on a spring of natural rate ω, with dry and viscous friction (ζ < 1). */
export interface FreeBody {
  /** Release point, at rest. */
  x0: number;
  /** Kinetic and static friction over stiffness. */
  xk: number;
  xs: number;
  /** ζ; 0 without viscous damping. */
  ratio: number;
}

/**
 * The release point and every turning point up to the rest, from the closed form: on each half-cycle the body swings about
 * ±xk, so that x → s xk − B (x − s xk), s the side it comes from, B = exp(−πζ/√(1−ζ²)); it rests at the first turning point
 * with |x| ≤ xs. Each half-cycle takes π/(ω√(1−ζ²)).
 */
export function freeDecay({ x0, xk, xs, ratio }: FreeBody): number[] {
  const decay = Math.exp((-Math.PI * ratio) / Math.sqrt(1 - ratio * ratio));
  const points = [x0];
  for (let x = x0; Math.abs(x) > xs * (1 + 1e-12); points.push(x)) {
    const centre = Math.sign(x) * xk;
    x = centre - decay * (x - centre);
  }
  return points;
}

/** The way along the turning points. */
export function wayAlong(points: readonly number[]): number {
  return points.slice(1).reduce((way, x, i) => way + Math.abs(x - points[i]), 0);
}

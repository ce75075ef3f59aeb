/**
 * The motion without stops of m ẍ + c ẋ + k x = P cos(Ω t + φ) − F sgn ẋ (Den Hartog 1931), in units m = k = P = 1:
 * r = Ω/ω, β = F/P. Signs: the half-cycle from t = 0 goes from +X down to −X, with friction +F.
 */
export interface NoStopMotion {
  /** X, in units of P/k. */
  amplitude: number;
  /** φ for which t = 0 is the upper turning point, degrees. */
  phase: number;
}

/**
 * Found from the half-cycle alone: x = β + Q cos(r t + φ − ψ) + e^(−ζt)(a cos st + b sin st) must arrive at t = π/r with
 * x and ẋ reversed, and ẋ(0) = 0; s = √(1−ζ²), Q² = 1/((1−r²)² + (2ζr)²).
 */
export function noStopMotion(r: number, ratio: number, beta: number): NoStopMotion {
  const s = Math.sqrt(1 - ratio * ratio);
  const shrink = Math.exp((-ratio * Math.PI) / r);
  const angle = (s * Math.PI) / r;
  const [C, S] = [shrink * Math.cos(angle), shrink * Math.sin(angle)];
  // Reversal of the free part and its velocity: (1 + C) a + S b = −2β and, with v = ẋ of the free part at 0,
  // v = s b − ζ a, reversed at the end: the pair (a, b) turns by C, S alone, so −S a + (1 + C) b = −2β ζ/s.
  const determinant = (1 + C) * (1 + C) + S * S;
  const [first, second] = [-2 * beta, (-2 * beta * ratio) / s];
  const a = ((1 + C) * first - S * second) / determinant;
  const b = (S * first + (1 + C) * second) / determinant;
  const size = 1 / Math.hypot(1 - r * r, 2 * ratio * r);
  const lag = Math.atan2(2 * ratio * r, 1 - r * r);
  const sine = (s * b - ratio * a) / (size * r);
  const angleAtTop = Math.asin(sine);
  const reach = (cosine: number) => beta + a + size * cosine;
  return {
    amplitude: reach(Math.cos(angleAtTop)),
    phase: ((angleAtTop + lag) * 180) / Math.PI,
  };
}

/** U and S of the undamped case, and the largest β that has no stop: β² = V²/(U² + (S/r²)²). */
export function noStopLimit(r: number): { U: number; S: number; beta: number } {
  const V = 1 / (1 - r * r);
  const U = Math.sin(Math.PI / r) / (r * (1 + Math.cos(Math.PI / r)));
  const S = largest((angle) => {
    const bracket = r * Math.sin(angle / r) + U * r * r * (Math.cos(angle) - Math.cos(angle / r));
    return bracket / Math.sin(angle);
  });
  return { U, S, beta: Math.abs(V) / Math.hypot(U, S / (r * r)) };
}

/** The largest value over (0, π) by a fine scan and golden-section search; the limit at 0 is 1. */
function largest(f: (angle: number) => number): number {
  const count = 20000;
  const at = (i: number) => (Math.PI * i) / count;
  let best = 1;
  for (let i = 1; i < count; i++) if (f(at(i)) > f(at(best))) best = i;
  let [low, high] = [at(best - 1) || 1e-9, at(best + 1)];
  for (let i = 0; i < 80; i++) {
    const [left, right] = [high - (high - low) * 0.618, low + (high - low) * 0.618];
    if (f(left) > f(right)) high = right;
    else low = left;
  }
  return Math.max(1, f((low + high) / 2));
}

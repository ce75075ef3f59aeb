/**
 * The steady motion without stops under P cos Ωt with friction F and damping ζ < 1, in units m = k = P = 1: r = Ω/ω, β = F/P.
 *
 * Source: Den Hartog, Phil. Mag. 9 (1930) 801 and Trans. ASME 53 (1931) 107; with damping after the same half-cycle
 * argument, the form from memory, recomputed here: X = −βG + √(1/q² − β²H²).
 */
export interface NoStopMotion {
  /** X k/P. */
  readonly amplitude: number;
  /** True where the velocity keeps its sign from the upper turning point to the lower: the motion has no stop with F_s = F_k. */
  readonly isWithoutStop: boolean;
  /** P cos φ − kX, the force left on the body at its upper turning point, over P; friction must not hold it. */
  readonly forceAtTurn: number;
}

/** Points of the half-cycle at which the velocity is looked at. */
const looks = 1000;

/** Null where friction is too large for any such motion (X would not be real), or at undamped resonance. */
export function noStopMotion(r: number, ratio: number, beta: number): NoStopMotion | null {
  const s = Math.sqrt(1 - ratio * ratio);
  const [grow, turn] = [(ratio * Math.PI) / r, (s * Math.PI) / r];
  // divided by cosh: large ζπ/r must not overflow
  const D = 1 + Math.cos(turn) / Math.cosh(grow);
  const lag = Math.sin(turn) / Math.cosh(grow);
  const G = (Math.tanh(grow) - (ratio / s) * lag) / D;
  const H = lag / (r * s * D);
  const size = 1 / Math.hypot(1 - r * r, 2 * ratio * r);
  const square = size * size - beta * beta * H * H;
  if (!Number.isFinite(size) || !(square >= 0)) return null;
  const root = Math.sqrt(square);
  const amplitude = root - beta * G;
  if (!(amplitude > 0)) return null;
  return half({ r, ratio, s, beta, G, H, root, amplitude });
}

interface Half {
  r: number;
  ratio: number;
  s: number;
  beta: number;
  G: number;
  H: number;
  root: number;
  amplitude: number;
}

/**
 * The half-cycle itself: x = β + root cos rt + βH sin rt + e^(−ζt)(a cos st + b sin st) from x = X, ẋ = 0, friction +β.
 */
function half({ r, ratio, s, beta, G, H, root, amplitude }: Half): NoStopMotion {
  const a = -beta * (1 + G);
  const b = (ratio * a - beta * H * r) / s;
  const velocity = (t: number): number => {
    const free = Math.exp(-ratio * t) * ((s * b - ratio * a) * Math.cos(s * t) - (s * a + ratio * b) * Math.sin(s * t));
    return r * (beta * H * Math.cos(r * t) - root * Math.sin(r * t)) + free;
  };
  // the force that makes the harmonic part h is h″ + 2ζh′ + h
  const force = (1 - r * r) * root + 2 * ratio * r * beta * H;
  const forceAtTurn = force - amplitude;
  const keepsSign = (): boolean => {
    for (let i = 1; i < looks; i++) if (velocity((Math.PI * i) / (r * looks)) >= 0) return false;
    return true;
  };
  return { amplitude, forceAtTurn, isWithoutStop: forceAtTurn + beta < 0 && keepsSign() };
}

/** The largest β that has a motion without stops, by halving; 0 where none has (r = 1/3, 1/5 …). */
export function noStopLimit(r: number, ratio: number): number {
  let [low, high] = [0, 1];
  for (let i = 0; i < 50; i++) {
    const middle = (low + high) / 2;
    if (noStopMotion(r, ratio, middle)?.isWithoutStop) low = middle;
    else high = middle;
  }
  return low < 1e-9 ? 0 : low;
}

/** A body of mass m pushed through a spring k and a damper c, whose far end is fed at V; held by up to Fs, rubbed by Fk. */
export interface FedBody {
  readonly mass: number;
  readonly stiffness: number;
  readonly damping: number;
  readonly holding: number;
  readonly sliding: number;
  readonly feed: number;
}

export interface FeedCycle {
  /** From rest with the spring relaxed, s. */
  readonly firstBreakAway: number;
  readonly slipTime: number;
  readonly stickTime: number;
  /** What the body goes forward in one slip, m: all that the far end goes in one cycle. */
  readonly slipDistance: number;
  /** The most the body is behind the far end, m. */
  readonly mostBehind: number;
}

/**
 * The stick-slip of a fed body, worked out by hand. With d the deflection (body minus far end), a stick ends where
 * k V t + c V = Fs, that is at d = −(Fs − cV)/k. The slip that follows is u = d + Fk/k, m ü + c u̇ + k u = 0 from
 * u̇ = −V, and ends where the body stands again, u̇ = −V; the next stick lasts until d is back where it broke away.
 */
export function feedCycle({ mass, stiffness, damping, holding, sliding, feed }: FedBody): FeedCycle {
  const breakAway = -(holding - damping * feed) / stiffness;
  const decay = damping / (2 * mass);
  const turning = Math.sqrt(stiffness / mass - decay * decay);
  const cosine = breakAway + sliding / stiffness;
  const sine = (decay * cosine - feed) / turning;
  const wave = (t: number, c: number, s: number) =>
    Math.exp(-decay * t) * (c * Math.cos(turning * t) + s * Math.sin(turning * t));
  const deflection = (t: number) => wave(t, cosine, sine) - sliding / stiffness;
  const rate = (t: number) => wave(t, turning * sine - decay * cosine, -turning * cosine - decay * sine);
  const step = 1 / (200 * turning);
  const slipTime = firstFall((t) => rate(t) + feed, step);
  const mostAt = firstFall((t) => -rate(t), step);
  const wayBack = deflection(slipTime) - breakAway;
  return {
    firstBreakAway: -breakAway / feed,
    slipTime,
    stickTime: wayBack / feed,
    slipDistance: wayBack + feed * slipTime,
    mostBehind: -deflection(mostAt),
  };
}

/** The first t after `step` at which f falls through 0, by halving. */
function firstFall(f: (t: number) => number, step: number): number {
  let [low, high] = [step, 2 * step];
  while (f(high) > 0) [low, high] = [high, high + step];
  for (let i = 0; i < 60; i++) {
    const middle = (low + high) / 2;
    if (f(middle) > 0) low = middle;
    else high = middle;
  }
  return low;
}

import type { Term } from "@restband/solver";

/** One smooth stretch of an input: it acts from `from` (s) until the next piece of the same term begins. */
export interface Piece {
  readonly from: number;
  /** F in N, y in m or ÿ in m/s², whatever the term gives. */
  readonly value: (t: number) => number;
  /** Its time derivative. */
  readonly rate: (t: number) => number;
  /** Its second time derivative. */
  readonly bend: (t: number) => number;
}

/** A term of the scenario format as pieces in time order, the first from −∞. Written from the format's table alone. */
export function piecesOf(term: Term): Piece[] {
  switch (term.kind) {
    case "constant":
      return [level(-Infinity, term.value)];
    case "step":
      return [level(-Infinity, 0), level(term.start, term.value)];
    case "ramp":
      return ramp(term);
    case "harmonic":
      return [wave(-Infinity, term.amplitude, 2 * Math.PI * term.hz, radians(term.phase))];
    case "unbalance":
      return [unbalance(2 * Math.PI * term.hz, term)];
    case "pulse":
      return pulse(term);
    case "move":
      return [level(-Infinity, 0), ...travel(term.start, 0, term.distance, term)];
    case "staircase":
      return staircase(term);
    case "record":
      return "times" in term ? record(term.times, term.values, false) : stored();
    case "acceleration-record":
      return "times" in term ? record(term.times, term.values, true) : stored();
    case "chirp":
      throw new Error("the judge knows no chirp");
  }
}

/** How long one travel of the given distance takes, s. */
export function travelSeconds(distance: number, speed: number, acceleration: number): number {
  const far = Math.abs(distance);
  const peak = Math.min(speed, Math.sqrt(far * acceleration));
  return peak / acceleration + far / peak;
}

const radians = (degrees: number): number => (degrees * Math.PI) / 180;

function stored(): never {
  throw new Error("the judge reads inline records only");
}

function level(from: number, value: number): Piece {
  return { from, value: () => value, rate: () => 0, bend: () => 0 };
}

/** The parabola start + speed·τ + acceleration·τ²/2 with τ = t − from. */
function parabola(from: number, start: number, speed: number, acceleration: number): Piece {
  return {
    from,
    value: (t) => start + (t - from) * (speed + 0.5 * acceleration * (t - from)),
    rate: (t) => speed + acceleration * (t - from),
    bend: () => acceleration,
  };
}

/** amplitude·cos(omega·t + phase), from `from` on. */
function wave(from: number, amplitude: number, omega: number, phase: number): Piece {
  return {
    from,
    value: (t) => amplitude * Math.cos(omega * t + phase),
    rate: (t) => -amplitude * omega * Math.sin(omega * t + phase),
    bend: (t) => -amplitude * omega * omega * Math.cos(omega * t + phase),
  };
}

function ramp(term: Extract<Term, { kind: "ramp" }>): Piece[] {
  const rising = [level(-Infinity, 0), parabola(term.start, 0, term.rate, 0)];
  return term.stop === "none" ? rising : [...rising, level(term.stop, term.rate * (term.stop - term.start))];
}

function pulse(term: Extract<Term, { kind: "pulse" }>): Piece[] {
  const { peak, start, duration } = term;
  const around = (inside: Piece[]) => [level(-Infinity, 0), ...inside, level(start + duration, 0)];
  if (term.shape === "rectangle") return around([level(start, peak)]);
  if (term.shape === "triangle") {
    const slope = (2 * peak) / duration;
    return around([parabola(start, 0, slope, 0), parabola(start + duration / 2, peak, -slope, 0)]);
  }
  const omega = Math.PI / duration;
  return around([wave(start, peak, omega, -omega * start - Math.PI / 2)]);
}

function unbalance(omega: number, term: Extract<Term, { kind: "unbalance" }>): Piece {
  return wave(-Infinity, term.mass * term.eccentricity * omega * omega, omega, radians(term.phase));
}

/** One trapezoidal (or, when short, triangular) travel from y0, and the level after it. */
function travel(
  start: number,
  y0: number,
  distance: number,
  { speed, acceleration }: { speed: number; acceleration: number },
): Piece[] {
  const direction = Math.sign(distance);
  const peak = Math.min(speed, Math.sqrt(Math.abs(distance) * acceleration));
  const rise = peak / acceleration;
  const run = direction * (peak * rise * 0.5);
  const cruise = travelSeconds(distance, speed, acceleration) - 2 * rise;
  return [
    parabola(start, y0, 0, direction * acceleration),
    ...(cruise > 0 ? [parabola(start + rise, y0 + run, direction * peak, 0)] : []),
    parabola(start + rise + cruise, y0 + distance - run, direction * peak, -direction * acceleration),
    level(start + 2 * rise + cruise, y0 + distance),
  ];
}

function staircase(term: Extract<Term, { kind: "staircase" }>): Piece[] {
  const moves = Array.from({ length: term.count }, (_, i) =>
    travel(term.start + i * term.dwell, i * term.increment, term.increment, term),
  );
  return [level(-Infinity, 0), ...moves.flat()];
}

/** Straight lines through the points; before and after them the end values, or zero for an acceleration. */
function record(times: number[], values: number[], isZeroOutside: boolean): Piece[] {
  const last = times.length - 1;
  const lines = times.slice(0, last).map((from, i) => {
    const slope = (values[i + 1] - values[i]) / (times[i + 1] - from);
    return parabola(from, values[i], slope, 0);
  });
  const before = level(-Infinity, isZeroOutside ? 0 : values[0]);
  return [before, ...lines, level(times[last], isZeroOutside ? 0 : values[last])];
}

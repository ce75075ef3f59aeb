import { gaussNodes, gaussWeights } from "../numerics/gauss-legendre.ts";
import { peak } from "../numerics/peak.ts";
import type { Motion } from "./motion.ts";
import { emptyState, type State } from "./state.ts";

/** A number that every instant of a run has: a displacement, a power. */
export type Channel = (state: State) => number;

/** Extremes (one-sided limits at jumps included) and time integrals of channels over a window of a run. */
export interface Survey {
  /** Length of the window, s. */
  readonly duration: number;
  min(channel: Channel): number;
  max(channel: Channel): number;
  /** Larger of |min| and |max|. */
  peak(channel: Channel): number;
  /** ∫ channel dt over the window. */
  integral(channel: Channel): number;
  /** ∫ |channel| dt to a few per cent, over the same nodes: rounding of the integral is measured by it. */
  gross(channel: Channel): number;
}

interface Tally {
  readonly channel: Channel;
  /** False where only integrals are asked for. */
  readonly hasExtremes: boolean;
  min: number;
  max: number;
  sum: number;
  gross: number;
  /** Node values of the panel in hand, ends included. */
  readonly values: Float64Array;
}

const nodes = gaussNodes.length + 2;

/**
 * Goes over [from, to] once for all channels. Each smooth stretch is cut into panels over which nothing turns by more
 * than two radians; integrals by ten-point Gauss on each (products of two such channels to rounding), extremes from the
 * same nodes and the panel's ends, a top between nodes polished by Brent's method. A top narrower than the spacing of
 * nodes (at most 0.3 rad of the fastest rate, 0.6 for a product) would be missed; closed forms have none. A segment that
 * only repeats itself is gone over for one period.
 *
 * @param channels functions of the state; ask the result with the same function objects
 * @param integrands channels of which only integrals are asked: their tops are not looked for, which saves most of the work
 */
export function survey(
  motion: Motion,
  from: number,
  to: number,
  channels: readonly Channel[],
  integrands: readonly Channel[] = [],
): Survey {
  const withExtremes = new Set(channels);
  const tallies = [...new Set([...channels, ...integrands])].map((one) => newTally(one, withExtremes.has(one)));
  const state = emptyState();
  const times = new Float64Array(nodes);
  for (let i = motion.find(from); i < motion.count && motion.from(i) <= to; i++) {
    const end = Math.min(to, motion.to(i));
    let start = Math.max(from, motion.from(i));
    const period = motion.period(i, start);
    const repeats = period > 0 ? Math.floor((end - start) / period) : 0;
    if (repeats > 1) {
      goOver(motion, i, start, start + period, repeats, tallies, times, state);
      start += repeats * period;
    }
    if (start <= end) goOver(motion, i, start, end, 1, tallies, times, state);
  }
  return new Tallied(tallies, to - from);
}

/** Panel by panel from start to end; what is found there counts `repeats` times. */
function goOver(
  motion: Motion,
  i: number,
  start: number,
  end: number,
  repeats: number,
  tallies: readonly Tally[],
  times: Float64Array,
  state: State,
): void {
  for (let from = start; ;) {
    const width = 2 * motion.panel(i, from);
    const isLast = !(from + width > from && from + 1.001 * width < end);
    const stop = isLast ? end : from + width;
    surveyPanel(motion, i, from, stop, repeats, tallies, times, state);
    if (isLast) return;
    from = stop;
  }
}

function newTally(channel: Channel, hasExtremes: boolean): Tally {
  return {
    channel,
    hasExtremes,
    min: Infinity,
    max: -Infinity,
    sum: 0,
    gross: 0,
    values: new Float64Array(nodes),
  };
}

function surveyPanel(
  motion: Motion,
  i: number,
  start: number,
  stop: number,
  repeats: number,
  tallies: readonly Tally[],
  times: Float64Array,
  state: State,
): void {
  const width = stop - start;
  for (let n = 0; n < nodes; n++) {
    const at = n === 0 ? -1 : n === nodes - 1 ? 1 : gaussNodes[n - 1];
    times[n] = n === nodes - 1 ? stop : start + ((1 + at) / 2) * width;
    motion.read(i, times[n], state);
    for (const tally of tallies) tally.values[n] = tally.channel(state);
  }
  for (const tally of tallies) {
    let sum = 0;
    let gross = 0;
    for (let n = 0; n < gaussWeights.length; n++) {
      const part = gaussWeights[n] * tally.values[n + 1];
      sum += part;
      gross += Math.abs(part);
    }
    tally.sum += (repeats * sum * width) / 2;
    tally.gross += (repeats * gross * width) / 2;
    if (tally.hasExtremes) takeExtremes(motion, i, tally, times, state);
  }
}

function takeExtremes(motion: Motion, i: number, tally: Tally, times: Float64Array, state: State): void {
  const { values } = tally;
  for (let n = 0; n < nodes; n++) {
    if (values[n] > tally.max) tally.max = values[n];
    if (values[n] < tally.min) tally.min = values[n];
  }
  for (let n = 1; n + 1 < nodes; n++) polish(motion, i, tally, times, state, n, times[n], values[n]);
  // between the outermost node and the end of the panel no node can stand out: the parabola through three of them tells
  for (const n of [1, nodes - 2]) {
    const t = vertex(times, values, n);
    const isOutside = n === 1 ? t > times[0] && t < times[1] : t > times[n] && t < times[n + 1];
    if (!isOutside) continue;
    motion.read(i, t, state);
    const value = tally.channel(state);
    const outer = n === 1 ? 0 : n + 1;
    if (value > Math.max(values[n], values[outer]) || value < Math.min(values[n], values[outer])) {
      polish(motion, i, tally, times, state, n, t, value);
    }
  }
}

/** Where the parabola through nodes n − 1, n, n + 1 has its top or bottom; NaN where it is a line. */
function vertex(times: Float64Array, values: Float64Array, n: number): number {
  const left = times[n] - times[n - 1];
  const right = times[n] - times[n + 1];
  const r = left * (values[n] - values[n + 1]);
  const q = right * (values[n] - values[n - 1]);
  return times[n] - (0.5 * (left * r - right * q)) / (r - q);
}

/** Takes the top or bottom about t, between the nodes on both sides of n, into the tally if it could be a new extreme. */
function polish(
  motion: Motion,
  i: number,
  tally: Tally,
  times: Float64Array,
  state: State,
  n: number,
  t: number,
  at: number,
): void {
  const { values } = tally;
  const isTop = at >= values[n - 1] && at >= values[n + 1];
  const isBottom = at <= values[n - 1] && at <= values[n + 1];
  if (isTop === isBottom) return;
  const sign = isTop ? 1 : -1;
  const best = isTop ? tally.max : -tally.min;
  const bend = Math.max(Math.abs(at - values[n - 1]), Math.abs(at - values[n + 1]));
  if (sign * at + bend <= best) return;
  const value = (time: number): number => {
    motion.read(i, time, state);
    return sign * tally.channel(state);
  };
  const top = peak(value, times[n - 1], t, times[n + 1], sign * at);
  if (isTop) tally.max = Math.max(tally.max, top);
  else tally.min = Math.min(tally.min, -top);
}

class Tallied implements Survey {
  private readonly byChannel: Map<Channel, Tally>;

  constructor(
    tallies: readonly Tally[],
    readonly duration: number,
  ) {
    this.byChannel = new Map(tallies.map((tally) => [tally.channel, tally]));
  }

  min(channel: Channel): number {
    return this.tally(channel, true).min;
  }

  max(channel: Channel): number {
    return this.tally(channel, true).max;
  }

  peak(channel: Channel): number {
    const { min, max } = this.tally(channel, true);
    return Math.max(Math.abs(min), Math.abs(max));
  }

  integral(channel: Channel): number {
    return this.tally(channel).sum;
  }

  gross(channel: Channel): number {
    return this.tally(channel).gross;
  }

  private tally(channel: Channel, needsExtremes = false): Tally {
    const tally = this.byChannel.get(channel);
    if (tally === undefined) throw new Error("a channel is read that was not surveyed");
    if (needsExtremes && !tally.hasExtremes) throw new Error("extremes are read of a channel that was only integrated");
    return tally;
  }
}

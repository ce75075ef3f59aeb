import { ruleFor, vertex, widestPanel, type PanelRule } from "../numerics/panel-rule.ts";
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
  /** Values at the nodes of the panel in hand, ends included. */
  readonly values: Float64Array;
}

/** As many nodes as a panel has at most. */
const mostNodes = 12;
/** Where the polynomial through the nodes is this close to the motion itself, of its range, it tells where a top is. */
const trusted = 1e-9;

/** A survey under way. */
interface Pass {
  readonly motion: Motion;
  readonly tallies: readonly Tally[];
  readonly state: State;
}

/** A panel in hand: part of segment i, with its rule. */
interface Panel {
  i: number;
  from: number;
  to: number;
  rule: PanelRule;
}

/**
 * Goes over [from, to] once for all channels. Each smooth stretch is cut into panels over which nothing turns by more
 * than about half a turn; integrals by Gauss's rule on each (products of two such channels to rounding), extremes from the same
 * nodes and the panel's ends, a top between them where the polynomial through all of them has it, by Brent's method, and its
 * value from the motion there. A top narrower than the spacing of nodes (at most 0.5 rad of the fastest rate, 1 for a
 * product) would be missed; closed forms have none. A segment that only repeats itself is gone over for one period.
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
  const pass = { motion, tallies, state: emptyState() };
  for (let i = motion.find(from); i < motion.count && motion.from(i) <= to; i++) {
    const end = Math.min(to, motion.to(i));
    let start = Math.max(from, motion.from(i));
    const period = motion.period(i, start);
    const repeats = period > 0 ? Math.floor((end - start) / period) : 0;
    if (repeats > 1) {
      goOver(pass, i, start, start + period, repeats);
      start += repeats * period;
    }
    if (start <= end) goOver(pass, i, start, end, 1);
  }
  return new Tallied(tallies, to - from);
}

function newTally(channel: Channel, hasExtremes: boolean): Tally {
  return { channel, hasExtremes, min: Infinity, max: -Infinity, sum: 0, gross: 0, values: new Float64Array(mostNodes) };
}

/** Panel by panel from start to end; what is found there counts `repeats` times. */
function goOver(pass: Pass, i: number, start: number, end: number, repeats: number): void {
  for (let from = start; ;) {
    const width = widestPanel * pass.motion.panel(i, from);
    const isLast = !(from + width > from && from + 1.001 * width < end);
    const to = isLast ? end : from + width;
    surveyPanel(
      pass,
      { i, from, to, rule: ruleFor(width < Infinity ? (widestPanel * (to - from)) / width : widestPanel) },
      repeats,
    );
    if (isLast) return;
    from = to;
  }
}

function surveyPanel({ motion, tallies, state }: Pass, panel: Panel, repeats: number): void {
  const { nodes, weights } = panel.rule;
  for (let n = 0; n < nodes.length; n++) {
    motion.read(panel.i, n === nodes.length - 1 ? panel.to : timeAt(panel, nodes[n]), state);
    for (let k = 0; k < tallies.length; k++) tallies[k].values[n] = tallies[k].channel(state);
  }
  const half = (repeats * (panel.to - panel.from)) / 2;
  for (let k = 0; k < tallies.length; k++) {
    const tally = tallies[k];
    let sum = 0;
    let gross = 0;
    for (let n = 1; n < nodes.length - 1; n++) {
      const part = weights[n] * tally.values[n];
      sum += part;
      gross += Math.abs(part);
    }
    tally.sum += sum * half;
    tally.gross += gross * half;
    if (tally.hasExtremes) takeExtremes(motion, panel, tally, state);
  }
}

function timeAt({ from, to }: Panel, u: number): number {
  return from + ((1 + u) / 2) * (to - from);
}

function takeExtremes(motion: Motion, panel: Panel, tally: Tally, state: State): void {
  const { values } = tally;
  const { nodes } = panel.rule;
  const last = nodes.length - 1;
  let low = values[0];
  let high = values[0];
  for (let n = 1; n <= last; n++) {
    if (values[n] > high) high = values[n];
    if (values[n] < low) low = values[n];
  }
  if (high > tally.max) tally.max = high;
  if (low < tally.min) tally.min = low;
  // a top stands out of its neighbours by less than the panel's range: most panels cannot reach the extremes so far
  if (high + (high - low) <= tally.max && low - (high - low) >= tally.min) return;
  for (let n = 1; n < last; n++) {
    const isTop = values[n] >= values[n - 1] && values[n] >= values[n + 1];
    const isBottom = values[n] <= values[n - 1] && values[n] <= values[n + 1];
    if (isTop === isBottom) continue;
    const bend = Math.max(Math.abs(values[n] - values[n - 1]), Math.abs(values[n] - values[n + 1]));
    polish(motion, panel, tally, state, {
      isTop,
      at: values[n],
      bend,
      u: vertex(nodes, values, n),
      a: nodes[n - 1],
      b: nodes[n + 1],
    });
  }
  takeAtEnd(motion, panel, tally, state, -1);
  takeAtEnd(motion, panel, tally, state, 1);
}

/** Between the end of a panel and the node next to it no node can stand out: there the slope at the end tells. */
function takeAtEnd(motion: Motion, panel: Panel, tally: Tally, state: State, end: -1 | 1): void {
  const { values } = tally;
  const { nodes } = panel.rule;
  const edge = end < 0 ? 0 : nodes.length - 1;
  const next = edge - end;
  const width = nodes[next] - nodes[edge];
  // on the way inwards
  const rise = panel.rule.slopeAtEnd(values, end) * width;
  const fall = values[edge] - values[next];
  if (rise === 0 || rise * fall < 0) return;
  const u = nodes[edge] + (width * rise) / (2 * (rise + fall));
  const [a, b] = end < 0 ? [nodes[edge], nodes[next]] : [nodes[next], nodes[edge]];
  polish(motion, panel, tally, state, { isTop: rise > 0, at: values[edge], bend: Math.abs(rise), u, a, b });
}

/** A top (or bottom) between a and b, near u; `at` is what is known of it, and it stands no more than `bend` out of that. */
interface Bump {
  isTop: boolean;
  at: number;
  bend: number;
  u: number;
  a: number;
  b: number;
}

/** Takes a top or bottom into the tally if it could be a new extreme. */
function polish(motion: Motion, panel: Panel, tally: Tally, state: State, { isTop, at, bend, u, a, b }: Bump): void {
  const sign = isTop ? 1 : -1;
  const best = isTop ? tally.max : -tally.min;
  if (sign * at + bend <= best) return;
  const { values } = tally;
  const place = panel.rule.top(values, u > a && u < b ? u : (a + b) / 2, a, b, isTop);
  const expected = sign * panel.rule.interpolate(values, place);
  if (expected + trusted * bend <= best) return;
  const read = (where: number): number => {
    motion.read(panel.i, timeAt(panel, where), state);
    return sign * tally.channel(state);
  };
  let value = read(place);
  const isTold = Math.abs(value - expected) <= trusted * bend && value >= sign * at;
  if (!isTold) value = peak(read, a, place > a && place < b ? place : (a + b) / 2, b, value);
  if (isTop) tally.max = Math.max(tally.max, value);
  else tally.min = Math.min(tally.min, -value);
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

import { compileProblem, steadyWindow } from "@restband/solver";
import { fastestHz } from "../../../compute/samples-for.ts";
import type { EvenTimes } from "../../../compute/solver-job.ts";
import type { Range } from "../part-of-run.ts";
import type { RunView } from "../run-view.ts";

/** What a spectrum is compared with: its frequency, Hz, and what it is called. */
export interface Rate {
  readonly hz: number;
  readonly name: "drive" | "ripple" | "stick–slip";
}

/** The part of a run whose spectrum is told. */
export interface SpectrumWindow extends EvenTimes {
  /** The rate of the drive, else of the ripple, else of the stick–slip; null where there is none. */
  readonly rate: Rate | null;
  /** Whole periods of that rate that the window is; null where it holds none, or no whole number. */
  readonly periods: number | null;
}

/** What the window is cut from: where the run goes on as it does for ever, or what is seen above. */
export type WindowPart = "steady" | "seen";

/** Instants to each period of the fastest thing put in or free to swing. */
const PER_PERIOD = 16;
const FEWEST = 2 ** 14;
const MOST = 2 ** 18;

/** Of fewer periods the lines that a Hann window makes of one order reach those of the next. */
export const FEWEST_PERIODS = 3;

/** The window, cut to whole periods at its end where there is a rate; null where the run lasts no time. */
export function spectrumWindow(view: RunView, part: WindowPart, seen: Range): SpectrumWindow | null {
  const { scenario, result } = view;
  const end = result.events[result.events.length - 1]?.t ?? view.end;
  const { from, to } = part === "seen" ? seen : steadyWindow(compileProblem(scenario), end);
  const fastest = fastestHz(scenario);
  // What is longer than so many instants can tell is told by its last part.
  const longest = fastest > 0 ? MOST / (PER_PERIOD * fastest) : Infinity;
  const range = { from: Math.max(from, to - longest), to };
  if (!(range.to > range.from)) return null;
  const cut = acrossBreakAways(view, range) ?? drivenPeriods(view, range);
  return { ...cut, count: instantsOver(cut.to - cut.from, fastest) };
}

type Cut = Omit<SpectrumWindow, "count">;

/** Of a steady drive, or of the ripple of N: as many whole periods as there is room for, to the end of the range. */
function drivenPeriods(view: RunView, { from, to }: Range): Cut {
  const rate = rateOf(view);
  // A range of exactly so many periods is one, however its length was rounded.
  const periods = rate ? Math.floor((to - from) * rate.hz * (1 + 1e-12)) : 0;
  if (!rate || periods === 0) return { from, to, rate, periods: null };
  return { from: Math.max(0, to - periods / rate.hz), to, rate, periods };
}

function rateOf({ scenario, driveHz }: RunView): Rate | null {
  if (driveHz !== null) return { hz: driveHz, name: "drive" };
  const { ripple } = scenario.contact.normal;
  return ripple ? { hz: ripple.hz, name: "ripple" } : null;
}

/**
 * Without a rate from outside: from the first break-away of the range to the last. Where they are too few to tell orders
 * apart, the last of the run, its first slip left out; where those are too few as well, none.
 */
function acrossBreakAways(view: RunView, { from, to }: Range): Cut | null {
  if (rateOf(view)) return null;
  const all = view.result.events.filter(({ kind }) => kind === "break-away").map(({ t }) => t);
  const within = all.filter((t) => t >= from && t <= to);
  const starts = within.length > FEWEST_PERIODS ? within : all.slice(1).slice(-FEWEST_PERIODS - 1);
  if (starts.length <= FEWEST_PERIODS || starts[starts.length - 1] > to) return null;
  const [first, last, periods] = [starts[0], starts[starts.length - 1], starts.length - 1];
  return { from: first, to: last, rate: { hz: periods / (last - first), name: "stick–slip" }, periods };
}

/** A power of two. */
function instantsOver(seconds: number, fastest: number): number {
  const wanted = Math.min(MOST, Math.max(FEWEST, PER_PERIOD * fastest * seconds));
  return 2 ** Math.ceil(Math.log2(wanted));
}

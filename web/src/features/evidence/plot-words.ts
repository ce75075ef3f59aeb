import { say } from "../../format/format-quantity.ts";
import { nounOf } from "../../format/noun.ts";
import { outcomeWords } from "../../format/outcomes.ts";
import type { Measure } from "../../format/unit.ts";
import type { Interval } from "../../compute/intervals.ts";
import { sayMany } from "../../format/words.ts";
import type { Frame, PanelKey } from "./frame.ts";
import type { LoopAxis, LoopFrame } from "./loop-frame.ts";
import type { RunView } from "./run-view.ts";
import { driveExtremes, extremesOf } from "./scales.ts";
import type { Range } from "./part-of-run.ts";

/** The figure in words, for those who cannot see it: what is drawn, between what values, over what part of the run. */
export function figureWords(view: RunView, frame: Pick<Frame, "from" | "to" | "panels">): string {
  const seconds = { dimension: "time", motion: view.scenario.motion } as const;
  const time =
    frame.from === 0
      ? `Over ${say(frame.to, seconds)}`
      : `From ${say(frame.from, seconds, { digits: 5 })} to ${say(frame.to, seconds, { digits: 5 })}`;
  return `${time}: ${frame.panels.map(({ key }) => panelWords(view, key, frame)).join("; ")}. ${outcomeSentence(view)}`;
}

function panelWords(view: RunView, key: PanelKey, { from, to }: Range): string {
  const { scenario, samples, inputs, drive } = view;
  const said = (value: number, dimension: Measure["dimension"]): string =>
    say(value, { dimension, motion: scenario.motion });
  const between = ([low, high]: readonly [number, number], dimension: Measure["dimension"]): string =>
    `from ${said(low, dimension)} to ${said(high, dimension)}`;
  const part = { from, to };
  if (key === "velocity") return `velocity ${between(extremesOf(samples, "v", part), "velocity")}`;
  if (key === "acceleration") return `acceleration ${between(extremesOf(samples, "a", part), "acceleration")}`;
  if (key === "friction") return `friction force ${between(extremesOf(samples, "f", part), "force")}`;
  if (key === "drive") return `${drive?.name} ${between(driveExtremes(view, part), "force")}`;
  const band =
    inputs.restBand === null
      ? ""
      : `, with the rest band of ±${said(inputs.restBand, "displacement")} about its equilibrium`;
  return `displacement of the ${nounOf(scenario)} ${between(extremesOf(samples, "x", part), "displacement")}${band}`;
}

function outcomeSentence({ scenario, result }: RunView): string {
  return result.outcome === null ? "" : `The ${nounOf(scenario)} ${outcomeWords[result.outcome]}.`;
}

/** A loop in words: how far it reaches to each side and up and down. */
export function loopWords(view: RunView, { title, across, upright }: LoopFrame): string {
  const between = ({ extremes: [low, high], measure }: LoopAxis): string =>
    `from ${say(low, measure)} to ${say(high, measure)}`;
  return `${title}: ${across.name} ${between(across)}; ${upright.name} ${between(upright)}. ${outcomeSentence(view)}`;
}

/** The strip in words: how often it sticks and for what share of the time. */
export function stripWords(intervals: readonly Interval[]): string {
  const total = intervals.reduce((sum, { from, to }) => sum + to - from, 0);
  const stuck = intervals.filter(({ phase }) => phase === 0);
  const share = stuck.reduce((sum, { from, to }) => sum + to - from, 0) / (total || 1);
  if (stuck.length === 0) return "Motion: it slides throughout and is never stuck.";
  if (share === 1) return "Motion: it is stuck throughout.";
  return `Motion: stuck ${sayMany(stuck.length, "time")}, for ${Math.round(100 * share)} % of the time shown.`;
}

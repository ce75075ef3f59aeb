import type { BoundaryValue, RangeReport, RangeVerdict } from "@restband/solver";
import { capitalised, listed, sayCount, sayMany } from "../../format/words.ts";

/** Says a number of the scenario by its name: "μs 0.162". Where it is rounded, towards the value given last, in SI. */
export type SayValue = (path: string, value: number, towards: number) => string;

/** The verdict on a limit over the ranges: "kept as entered" + "breaks from μs 0.162"; `remark` says why there is none. */
export interface RangeVerdictWords {
  readonly word: string;
  readonly breaks?: string;
  readonly remark?: string;
}

export function rangeVerdictWords(verdict: RangeVerdict, say: SayValue): RangeVerdictWords {
  switch (verdict.kind) {
    case "kept":
      return { word: "kept over the whole range" };
    case "broken":
      return { word: "broken as entered" };
    case "unjudged":
      return { word: "cannot be judged", remark: `Within the range: ${verdict.reason}` };
    case "breaks":
      return { word: "kept as entered", breaks: `breaks ${boundaryWords(verdict, say)}` };
  }
}

/** Rounded towards the value entered: never a value that breaks the limit said to keep it. */
function boundaryWords({ alone, together }: RangeVerdict & { kind: "breaks" }, say: SayValue): string {
  const words = ({ path, breaks, entered }: BoundaryValue): string => say(path, breaks, entered);
  if (together.length > 0) return `with ${listed(together.map(words))} together`;
  const sides = alone.slice(0, 2).map((value) => `${words(value)}${value.breaks < value.entered ? " down" : ""}`);
  return `from ${sides.join(" or ")}`;
}

/** The limits in a sentence by the worst of their verdicts over the ranges. */
export function rangesLine({ verdicts }: RangeReport, say: SayValue): string {
  const of = (kind: RangeVerdict["kind"]) => verdicts.filter((verdict) => verdict.kind === kind);
  const all = verdicts.length;
  const [broken, breaks, unjudged] = [of("broken").length, of("breaks"), of("unjudged").length];
  if (broken > 0) return `${some(broken, all)} broken as entered.`;
  if (breaks.length > 0) return breakingLine(breaks, all, say);
  if (unjudged > 0) return `${some(unjudged, all)} not to be judged over the whole range.`;
  return `${some(all, all)} kept over the whole range.`;
}

function breakingLine(breaks: readonly RangeVerdict[], all: number, say: SayValue): string {
  if (breaks.length > 1 || breaks[0].kind !== "breaks")
    return `Kept as entered, but ${breaks.length === all ? "all" : sayCount(breaks.length)} of ${sayCount(all)} limits break within the ranges.`;
  const where = boundaryWords(breaks[0], say);
  return all === 1
    ? `The limit is kept as entered and breaks ${where}.`
    : `Kept as entered, but one of ${sayCount(all)} limits breaks ${where}.`;
}

/** "The limit is", "Both limits are", "Two of four limits are". */
export function some(count: number, all: number): string {
  if (all === 1) return "The limit is";
  if (count === all) return all === 2 ? "Both limits are" : `All ${sayCount(all)} limits are`;
  return `${capitalised(sayCount(count))} of ${sayCount(all)} limits ${count === 1 ? "is" : "are"}`;
}

/** Where the ranges were run, and what that is worth. */
export function coverageWords({ plan, ran, notPossible }: RangeReport): string {
  const { corners, allCorners, ranges, leftOut } = plan;
  const isWhole = corners.length === allCorners;
  const which =
    ranges.length === 1
      ? "both ends of the range"
      : isWhole
        ? "every corner of the ranges"
        : `${ran.corners} corners spread among ${allCorners}`;
  const run = `Run at ${which}, at ${ran.along} points along single values and ${ran.within} points within: samples, not a proof.`;
  const impossible =
    notPossible === 0
      ? ""
      : `${capitalised(sayMany(notPossible, "point"))} of the ranges cannot be: the values do not go together.`;
  const left = leftOut.length === 0 ? "" : `Not run, being no single number: ${listed(leftOut)}.`;
  return [ranges.length === 0 ? "" : run, impossible, left].filter(Boolean).join(" ");
}

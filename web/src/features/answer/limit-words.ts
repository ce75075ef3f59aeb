import type { LimitVerdict } from "@restband/solver";
import { formatNumber } from "../../format/format-number.ts";
import { say } from "../../format/format-quantity.ts";
import { measureOfQuantity, quantityNamed } from "../../format/quantities.ts";
import type { Motion, Unit } from "../../format/unit.ts";
import { unitFor } from "../../format/units.ts";

/** A limit and its verdict, ready to be drawn and read. */
export interface LimitReading {
  readonly name: string;
  /** "at most 100 μm", "none allowed". */
  readonly demand: string;
  readonly verdict: "kept" | "broken" | "unknown";
  /** "broken", "kept", "cannot be judged". */
  readonly word: string;
  /** The value, or why there is none. */
  readonly value: string;
  /** What is to spare, or how far beyond. */
  readonly remark: string;
  /** Ends of the ruler. */
  readonly from: number;
  readonly to: number;
  readonly unit: Unit;
}

/** Reads a limit. `asEntered`: values of the scenario are known as ranges that this run has not gone through. */
export function readLimit(limit: LimitVerdict, motion: Motion, asEntered: boolean): LimitReading {
  const measure = measureOfQuantity(limit.quantity, motion);
  const size = Math.max(...[limit.min, limit.max, limit.value].map((each) => Math.abs(each ?? 0)));
  const unit = unitFor(size, measure);
  const words = (value: number): string => say(value, measure, { unit });
  const { from, to } = rulerEnds(limit, measure.isShare === true);
  return {
    name: quantityNamed(limit.quantity)?.label ?? limit.quantity,
    demand: demandOf(limit, words),
    verdict: limit.kept === null ? "unknown" : limit.kept ? "kept" : "broken",
    word: wordOf(limit.kept, asEntered),
    value: limit.value === null || limit.kept === null ? "" : words(limit.value),
    remark: remarkOf(limit, words),
    from,
    to,
    unit,
  };
}

function wordOf(kept: boolean | null, asEntered: boolean): string {
  if (kept === null) return "cannot be judged";
  return `${kept ? "kept" : "broken"}${asEntered ? " as entered only" : ""}`;
}

function demandOf({ min, max }: LimitVerdict, words: (value: number) => string): string {
  if (min !== undefined && max !== undefined) return `from ${words(min)} to ${words(max)}`;
  if (min !== undefined) return `at least ${words(min)}`;
  return max === 0 ? "none allowed" : `at most ${words(max ?? 0)}`;
}

function remarkOf({ kept, margin, reason, value, min, max }: LimitVerdict, words: (value: number) => string): string {
  if (kept === null || margin === null) return reason ?? "";
  if (kept) return margin === 0 ? "nothing to spare" : `${words(margin)} to spare`;
  const bound = value !== null && max !== undefined && value > max ? max : min;
  if (bound === 0) return `${words(0)} allowed`;
  const times = value !== null && bound !== undefined ? Math.abs(value / bound) : 0;
  return times >= 2 ? `${formatNumber(times, 2)} times the limit` : `${words(-margin)} beyond`;
}

/** From zero, or from well below a lower bound, to well beyond both the limit and the value; a share ends at its whole. */
function rulerEnds({ min, max, value }: LimitVerdict, isShare: boolean): { from: number; to: number } {
  const marks = [min, max, value].filter((each) => typeof each === "number");
  const low = Math.min(0, ...marks);
  const high = Math.max(0, ...marks);
  if (isShare && low >= 0 && high <= 1) return { from: 0, to: 1 };
  const from = low < 0 ? -roundUp(-low * 1.15) : 0;
  const to = high > 0 ? roundUp(high * 1.15) : 0;
  return from === to ? { from, to: from + 1 } : { from, to };
}

/** The next 1, 1.5, 2, 3, 5 or 8 of a decade: an end that can be read. */
function roundUp(value: number): number {
  const decade = 10 ** Math.floor(Math.log10(value));
  const step = [1, 1.5, 2, 3, 5, 8, 10].find((digit) => digit * decade >= value * (1 - 1e-12)) ?? 10;
  return Number((step * decade).toPrecision(12));
}

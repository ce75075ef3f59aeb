import type { Scenario, TextbookComparison, TextbookMismatch, TextbookSymbol } from "@restband/solver";
import { formatFixed, formatNumber } from "../../format/format-number.ts";
import { joined, readQuantity, type Reading } from "../../format/format-quantity.ts";
import { fromSi, type Measure, type Motion, type Unit } from "../../format/unit.ts";
import { unitFor } from "../../format/units.ts";

/** A formula beside the run, as the table shows it. */
export interface TextbookRow {
  readonly key: string;
  readonly label: string;
  readonly formula: string;
  readonly value: Reading;
  /** Null where the run does not tell it. */
  readonly ofRun: Reading | null;
  /** "−0.80 %"; empty where there is nothing to compare. */
  readonly difference: string;
  readonly note: string | null;
  /** Number of the source in the list under the table. */
  readonly source: number;
}

export interface TextbookTable {
  readonly rows: readonly TextbookRow[];
  readonly sources: readonly string[];
}

const digits = 4;

/** The rows of a textbook table and the sources they point to, each once. */
export function textbookTable(comparisons: readonly TextbookComparison[], { motion }: Scenario): TextbookTable {
  const sources = [...new Set(comparisons.map(({ companion }) => companion.source))];
  const rows = comparisons.map(({ companion, value, ofRun, difference, note }) => {
    const measure: Measure = { dimension: companion.dimension, motion };
    const unit = unitFor(value === 0 ? (ofRun ?? 0) : value, measure);
    return {
      key: companion.key,
      label: companion.label,
      formula: companion.formula,
      value: reading(value, measure, unit),
      ofRun: ofRun === null ? null : reading(ofRun, measure, unit),
      difference: differenceWords(difference),
      note,
      source: sources.indexOf(companion.source) + 1,
    };
  });
  return { rows, sources };
}

/** To as many digits in both columns, so that 39.00 stands beside 38.69; a count or a ratio without zeros behind it. */
function reading(value: number, measure: Measure, unit: Unit): Reading {
  const read = readQuantity(value, measure, { unit, digits });
  return measure.dimension === "none" ? read : { ...read, text: formatNumber(fromSi(value, unit), digits, true) };
}

/** Differences below what four digits show are none to a reader. */
function differenceWords(difference: number | null): string {
  if (difference === null) return "";
  const percent = 100 * difference;
  if (Math.abs(percent) < 0.005) return "none";
  const size = Math.abs(percent) < 10 ? formatFixed(percent, 2) : formatNumber(percent, 3);
  return `${percent > 0 ? "+" : ""}${size}\u00a0%`;
}

/** Formulas without a place here, gathered under the reason they share. */
export function mismatchGroups(
  mismatches: readonly TextbookMismatch[],
): readonly { reason: string; labels: readonly string[] }[] {
  const reasons = [...new Set(mismatches.map(({ reason }) => reason))];
  return reasons.map((reason) => ({
    reason,
    labels: mismatches.filter((mismatch) => mismatch.reason === reason).map(({ companion }) => companion.label),
  }));
}

/** "F_s = 296.5 N, ω = 182.6 rad/s": what the formulas call the parts of this scenario. */
export function symbolWords(symbols: readonly TextbookSymbol[], motion: Motion): string[] {
  return symbols.map(({ symbol, dimension, value }) => {
    const reading = readQuantity(value, { dimension, motion }, { digits });
    return `${symbol} = ${joined(symbol === "ω" ? { ...reading, unit: "rad/s" } : reading)}`;
  });
}

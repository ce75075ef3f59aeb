import type { Dimension } from "../field.ts";
import type { Result } from "../result.ts";
import type { Scenario } from "../scenario/scenario.ts";
import { feedSpeed } from "./feed.ts";
import { textbookCompanions } from "./index.ts";
import { textbookCase, type TextbookCase, type TextbookSettings } from "./textbook-case.ts";
import { reasonAgainst, type TextbookCompanion } from "./textbook-companion.ts";

/** A formula beside the run. */
export interface TextbookComparison {
  readonly companion: TextbookCompanion;
  /** SI. */
  readonly value: number;
  /** The run's own number, SI; null where it does not tell it. */
  readonly ofRun: number | null;
  /** (run − formula)/|formula|; null without either, or where the formula says 0. */
  readonly difference: number | null;
  readonly note: string | null;
}

/** A formula that has no place here, and why. */
export interface TextbookMismatch {
  readonly companion: TextbookCompanion;
  readonly reason: string;
}

/** A sign of the formulas with its value here. */
export interface TextbookSymbol {
  readonly symbol: string;
  readonly dimension: Dimension;
  readonly value: number;
}

export interface TextbookPage {
  readonly comparisons: readonly TextbookComparison[];
  readonly mismatches: readonly TextbookMismatch[];
  /** What the formulas call the parts of this scenario. */
  readonly symbols: readonly TextbookSymbol[];
}

/**
 * Every textbook formula that holds for a scenario beside the number its run gives, and why the others do not hold.
 * Throws RangeError where a record's points are missing from `settings.records`.
 */
export function compareWithTextbook(scenario: Scenario, result: Result, settings?: TextbookSettings): TextbookPage {
  const kase = textbookCase(scenario, result, settings);
  const judged = textbookCompanions.map((companion) => ({ companion, reason: reasonAgainst(companion, kase) }));
  return {
    comparisons: judged.filter(({ reason }) => reason === null).map(({ companion }) => comparison(companion, kase)),
    mismatches: judged.flatMap(({ companion, reason }) => (reason === null ? [] : [{ companion, reason }])),
    symbols: symbolsOf(kase),
  };
}

function comparison(companion: TextbookCompanion, kase: TextbookCase): TextbookComparison {
  const value = companion.value(kase);
  const ofRun = companion.ofRun(kase);
  const difference = ofRun === null || value === 0 ? null : (ofRun - value) / Math.abs(value);
  return { companion, value, ofRun, difference, note: companion.note?.(kase) ?? null };
}

function symbolsOf({ staticForce, kineticForce, omega, ratio, problem }: TextbookCase): TextbookSymbol[] {
  const symbols: (TextbookSymbol | false)[] = [
    staticForce > 0 && { symbol: "F_s", dimension: "force", value: staticForce },
    kineticForce !== null && kineticForce > 0 && { symbol: "F_k", dimension: "force", value: kineticForce },
    problem.stiffness > 0 && { symbol: "ω", dimension: "none", value: omega },
    ratio > 0 && { symbol: "ζ", dimension: "none", value: ratio },
    jumpOf(problem.stiffness, staticForce, kineticForce, feedSpeed(problem)),
  ];
  return symbols.filter((symbol) => symbol !== false);
}

/** d = (F_s − F_k)/k, told where a feed loads the spring. */
function jumpOf(k: number, fixed: number, sliding: number | null, feed: number | null): TextbookSymbol | false {
  if (feed === null || !(k > 0) || sliding === null || !(fixed > sliding)) return false;
  return { symbol: "d", dimension: "displacement", value: (fixed - sliding) / k };
}

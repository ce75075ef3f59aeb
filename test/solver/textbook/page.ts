import { compareWithTextbook, simulate, type TextbookComparison, type TextbookPage } from "@restband/solver";
import { buildScenario, type ScenarioSketch } from "../../support/scenario-builder.ts";

/** The textbook page of a sketched scenario, run by the solver. */
export function pageOf(sketch: ScenarioSketch, samples = 0): TextbookPage {
  const scenario = buildScenario(sketch);
  const result = simulate(scenario, { samples });
  if ("error" in result) throw new Error(`${result.error.path}: ${result.error.message}`);
  return compareWithTextbook(scenario, result);
}

/** One formula of a page; throws the reason where it does not apply. */
export function rowOf(page: TextbookPage, key: string): TextbookComparison & { ofRun: number } {
  const row = page.comparisons.find(({ companion }) => companion.key === key);
  if (!row) throw new Error(reasonOf(page, key));
  return { ...row, ofRun: row.ofRun ?? NaN };
}

/** Why a formula has no place on a page; "applies" where it has. */
export function reasonOf({ mismatches }: TextbookPage, key: string): string {
  return mismatches.find(({ companion }) => companion.key === key)?.reason ?? "applies";
}

/** The door of the solver: all that others may use. */
export { z } from "./scenario/zod.ts";
export * from "./scenario/scenario.ts";
export { canonicalForm, canonicalText, digestOf, recordDigest, storedForm } from "./scenario/canonical.ts";
export { checkScenario, type Checked } from "./scenario/check-scenario.ts";
export { checkTerm, type CheckedTerm } from "./scenario/check-term.ts";
export { compileProblem, gravity, normalForce } from "./scenario/compile-problem.ts";
export { fieldPaths } from "./scenario/field-paths.ts";
export * from "./scenario/fields.ts";
export { numericField, numericFields, readField, withField, type NumericField } from "./scenario/numeric-fields.ts";
export type { Problem } from "./scenario/problem.ts";
export { quantityNames, type QuantityName } from "./scenario/quantity-names.ts";
export { movedInputs } from "./scenario/moved-inputs.ts";
export { needsAdaptive } from "./scenario/needs-adaptive.ts";
export { pathsWithoutOrigin } from "./scenario/without-origin.ts";
export { unsupported } from "./scenario/unsupported.ts";

export type { Bounds, Choice, ChoiceOption, Dimension, Field, Rows } from "./field.ts";
export { frictionLaws, lawOf } from "./friction/index.ts";
export type { FrictionLaw } from "./friction/friction-law.ts";
export { excitationTerms, termOf } from "./excitation/index.ts";
export type { ExcitationTerm } from "./excitation/excitation-term.ts";
export { solidDampings, solidOf } from "./solid/index.ts";
export type { SolidDamping } from "./solid/solid-damping.ts";

export type { Refusal, SimulateOptions } from "./options.ts";
export * from "./result.ts";
export { jsonText } from "./json-text.ts";
export { simulate } from "./simulate.ts";
export { traceOf, type Trace } from "./trace.ts";
export { solverVersion } from "./version.ts";
export { quantities, quantityOf } from "./quantities/index.ts";
export type { Quantity } from "./quantities/quantity.ts";
export { isFed, lowestHz } from "./quantities/drive.ts";
export { steadyWindow } from "./quantities/steady-window.ts";
export { amplitudeSpectrum, spectralPeaks, type SpectralPeak, type Spectrum } from "./numerics/spectrum.ts";
export {
  compareWithTextbook,
  type TextbookComparison,
  type TextbookMismatch,
  type TextbookPage,
  type TextbookSymbol,
} from "./textbook/compare-with-textbook.ts";
export { textbookCompanions } from "./textbook/index.ts";
export type { TextbookSettings } from "./textbook/textbook-case.ts";
export type { TextbookCompanion } from "./textbook/textbook-companion.ts";
export { agreementOf, compareResults, type Agreement, type Comparison, type Deviation } from "./agreement.ts";
export { exploreRanges, type RangeReport, type RangeVerdict } from "./explore/range-verdict.ts";
export type { BoundaryValue, PointReply, RangeStep } from "./explore/range-verdict-boundary.ts";
export { planRanges, type KnownRange } from "./explore/range-verdict-plan.ts";
export * from "./explore/asking.ts";
export { defaultLinks, withValues, type Link, type Links } from "./explore/links.ts";
export { checkSweepPlan, type CheckedSweep } from "./explore/sweep/check-sweep-plan.ts";
export { sweepPlanSchema, type Continuation, type SweepAxis, type SweepPlan } from "./explore/sweep/sweep-plan.ts";
export {
  cellOutcomes,
  cellRefusals,
  keptAt,
  quantityAt,
  readRow,
  rowHead,
  rowLength,
  type CellFigures,
  type CellRefusal,
  type CellRow,
  type RowPlan,
} from "./explore/cells/cell-row.ts";
export type * from "./explore/threshold/threshold.ts";
export type { Cure, Cures } from "./explore/threshold/cure.ts";
export type { HoldingEnd, HoldingRange } from "./explore/threshold/holding-range.ts";
export { checkTolerancePlan, type CheckedTolerance } from "./explore/tolerance/check-tolerance-plan.ts";
export {
  tolerancePlanSchema,
  type Distribution,
  type JointInput,
  type RankCorrelation,
  type ScatteredInput,
  type TolerancePlan,
} from "./explore/tolerance/tolerance-plan.ts";
export type * from "./explore/tolerance/tolerance-summary.ts";
export { axisValues, cellCount, cellPlace, cellValues } from "./explore/sweep/axis-values.ts";
export { cellOf, cellReason } from "./explore/sweep/cell-of.ts";
export { runTile, type TileSettings } from "./explore/sweep/run-tile.ts";
export { mostTileCells, tileCells, tileCount, tileOrder } from "./explore/sweep/tiles.ts";
export { pythonScript, type Claim } from "./script/python-script.ts";
export { pythonGap } from "./script/not-covered.ts";
export { thresholdSearch } from "./explore/threshold/threshold-search.ts";
export { curesOf } from "./explore/threshold/cures.ts";
export { holdingPaths, holdingRanges } from "./explore/threshold/holding-ranges.ts";
export { drawScenario, drawsOf, type Draws } from "./explore/tolerance/draws.ts";
export { runDraws, studyRows, type DrawSettings } from "./explore/tolerance/run-draws.ts";
export { toleranceSummary } from "./explore/tolerance/summarise.ts";
export { variedPaths } from "./explore/tolerance/tolerance-plan.ts";
export { cellLines, sweepDigest } from "./explore/sweep/exchange.ts";
export { readAnswers, type ReadAnswers } from "./explore/sweep/read-answers.ts";
export {
  checkThresholdQuestion,
  thresholdPlanSchema,
  type CheckedThreshold,
  type ThresholdPlan,
} from "./explore/threshold/check-threshold-question.ts";
export * from "./explore/sweep/limit-lines.ts";
export { textbookBeside, type TextbookBeside } from "./explore/sweep/textbook-beside.ts";

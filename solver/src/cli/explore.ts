import { answerAll } from "../explore/asking.ts";
import { readRow, rowLength, withLimitQuantities, type CellRefusal } from "../explore/cells/cell-row.ts";
import { cellCount } from "../explore/sweep/axis-values.ts";
import { cellOf, cellReason } from "../explore/sweep/cell-of.ts";
import { checkSweepPlan } from "../explore/sweep/check-sweep-plan.ts";
import { cellLines, cellsHeader } from "../explore/sweep/exchange.ts";
import { readAnswers } from "../explore/sweep/read-answers.ts";
import { SweepRunner } from "../explore/sweep/run-tile.ts";
import type { SweepPlan } from "../explore/sweep/sweep-plan.ts";
import { tileCells, tileCount } from "../explore/sweep/tiles.ts";
import { checkThresholdQuestion } from "../explore/threshold/check-threshold-question.ts";
import { thresholdSearch } from "../explore/threshold/threshold-search.ts";
import { checkTolerancePlan } from "../explore/tolerance/check-tolerance-plan.ts";
import { drawsOf } from "../explore/tolerance/draws.ts";
import { runDraws } from "../explore/tolerance/run-draws.ts";
import { toleranceSummary } from "../explore/tolerance/summarise.ts";
import { jsonText } from "../json-text.ts";
import { checkScenario } from "../scenario/check-scenario.ts";
import type { Fault, Scenario } from "../scenario/scenario.ts";
import { parse } from "./answer.ts";
import type { ExploreCommand } from "./explore-arguments.ts";
import { readText, told } from "./files.ts";
import { writeLine } from "./lines.ts";

const refusedStatus = 1;

/** Explores a scenario by a plan, both files: the answer on standard output, or every fault on standard error, a line each. */
export async function explore(command: ExploreCommand): Promise<number> {
  const { value: content, faults: unread } = await readJson(command.file);
  const { scenario, faults } = unread.length > 0 ? { scenario: null, faults: unread } : checkScenario(content);
  if (scenario === null) return refuse(command.file, faults);
  const { value: plan, faults: unreadPlan } = await readJson(command.plan);
  if (unreadPlan.length > 0) return refuse(command.plan, unreadPlan);
  if (command.kind === "search") return search(command, plan, scenario);
  return command.kind === "sweep" ? sweep(command, plan, scenario) : study(command, plan, scenario);
}

async function readJson(file: string): Promise<{ value: unknown; faults: Fault[] }> {
  const read = parse(await readText(file));
  return "fault" in read ? { value: null, faults: [read.fault] } : { value: read.value, faults: [] };
}

function refuse(file: string, faults: readonly Fault[]): number {
  for (const { path, message } of faults) process.stderr.write(`${file}: ${told(path, message)}\n`);
  return refusedStatus;
}

async function search({ plan: file }: ExploreCommand, input: unknown, scenario: Scenario): Promise<number> {
  const { question, faults } = checkThresholdQuestion(input, scenario);
  if (question === null) return refuse(file, faults);
  await writeLine(process.stdout, jsonText(answerAll(thresholdSearch(question))));
  return 0;
}

async function study({ plan: file }: ExploreCommand, input: unknown, scenario: Scenario): Promise<number> {
  const { plan, faults } = checkTolerancePlan(input, scenario);
  if (plan === null) return refuse(file, faults);
  const rows = runDraws(scenario, plan, drawsOf(plan), [0, plan.runs]);
  await writeLine(process.stdout, jsonText(toleranceSummary(plan, scenario, rows ?? new Float64Array(0))));
  return 0;
}

async function sweep(command: ExploreCommand, input: unknown, scenario: Scenario): Promise<number> {
  const { plan, faults } = checkSweepPlan(input, scenario);
  if (plan === null) return refuse(command.plan, faults);
  if (command.answers !== null) return checkAnswers(command.answers, plan, scenario);
  if (command.isCellsOnly && plan.continuation !== "none")
    return refuse(command.plan, [
      { path: "continuation", message: "Cells that follow one another cannot be solved apart." },
    ]);
  const lines = command.isCellsOnly ? cellLines(scenario, plan) : solvedLines(scenario, plan);
  for (const line of lines) await writeLine(process.stdout, line);
  return 0;
}

function* cellsInOrder(plan: SweepPlan): Generator<number> {
  if (plan.continuation === "none") for (let index = 0; index < cellCount(plan); index++) yield index;
  else for (let tile = 0; tile < tileCount(plan); tile++) yield* tileCells(plan, tile);
}

/** The header, then an answer for each cell, in the order in which cells follow one another. */
function* solvedLines(scenario: Scenario, plan: SweepPlan): Generator<string> {
  const whole = { ...plan, ...withLimitQuantities(plan, scenario.limits) };
  const runner = new SweepRunner(scenario, whole, undefined);
  const row = new Float64Array(rowLength(whole));
  yield cellsHeader(scenario, plan);
  for (const index of cellsInOrder(plan)) {
    row.fill(0);
    runner.run(index, row);
    const { outcome, refusal, quantities } = readRow(row, 0, whole, scenario.limits.length);
    const reason = refusal === null ? [] : [reasonOf(scenario, whole, index, refusal)];
    yield jsonText([index, outcome, ...quantities, ...reason]);
  }
}

/** As `--lines` tells it of the same cell. */
function reasonOf(scenario: Scenario, plan: SweepPlan, index: number, refusal: CellRefusal): string {
  if (refusal === "max-events" || refusal === "max-work") return `The run ended by ${refusal}.`;
  const [fault] = cellOf(scenario, plan, index).faults;
  return fault === undefined ? cellReason(scenario, plan, index, refusal) : told(fault.path, fault.message);
}

async function checkAnswers(file: string, plan: SweepPlan, scenario: Scenario): Promise<number> {
  const read = readAnswers(scenario, plan, (await readText(file)).split("\n"));
  if (read.tiles === null) return refuse(file, read.faults);
  const found = `${cellCount(plan)} cells, all answered; ${read.recomputed} run again here, all agree.`;
  await writeLine(process.stdout, found);
  return 0;
}

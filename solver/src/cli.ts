import { answerText, parse, refusal, written } from "./cli/answer.ts";
import { type Command, readArguments, usage, UsageError } from "./cli/arguments.ts";
import { answerCell, checkCells } from "./cli/cells.ts";
import { explore } from "./cli/explore.ts";
import { readExploreArguments } from "./cli/explore-arguments.ts";
import { readText, told } from "./cli/files.ts";
import { linesOf, writeLine } from "./cli/lines.ts";
import { scriptText } from "./cli/script-text.ts";
import { cellsFormat } from "./explore/sweep/exchange.ts";
import { jsonText } from "./json-text.ts";
import type { Refusal, SimulateOptions } from "./options.ts";
import { ownMember } from "./scenario/own-member.ts";

const refusedStatus = 1;
const badUsage = 2;

/** Answers one file: the result on standard output, or every fault on standard error, a line each. */
async function solveFile(file: string, options: SimulateOptions): Promise<number> {
  return tellFile(written(answerText(await readText(file), options)));
}

async function tellFile({ text, refused }: { text: string; refused: Refusal | null }): Promise<number> {
  if (refused === null) {
    await writeLine(process.stdout, text);
    return 0;
  }
  for (const { path, message } of refused.error.faults) process.stderr.write(`${told(path, message)}\n`);
  return refusedStatus;
}

/** Writes a Python file that recomputes what this solver says of a scenario; where there is none, why. */
async function scriptFile(file: string, { method }: SimulateOptions): Promise<number> {
  return tellFile(scriptText(await readText(file), { method, samples: 0 }));
}

/** Answers each line in its place. A first line that is a header of cells makes the others cells. */
async function solveLines(options: SimulateOptions): Promise<number> {
  const lines = linesOf(process.stdin);
  const first = await lines.next();
  if (first.done) return 0;
  const header = parse(first.value);
  if ("value" in header && ownMember(header.value, "format") === cellsFormat)
    return solveCells(header.value, lines, options);
  let status = await solveLine(first.value, 1, options);
  let number = 1;
  for await (const line of lines) status = Math.max(status, await solveLine(line, ++number, options));
  return status;
}

async function solveLine(line: string, number: number, options: SimulateOptions): Promise<number> {
  const { text, refused } = written(answerText(line, options));
  await writeLine(process.stdout, text);
  return refused === null ? 0 : tellRefused(refused, `line ${number}: `);
}

/** A refused cell is a cell of the sweep: only a header that is refused is a failure. */
async function solveCells(header: unknown, lines: AsyncIterable<string>, options: SimulateOptions): Promise<number> {
  const { cells, faults } = checkCells(header);
  if (cells === null) {
    const refused = refusal(faults);
    await writeLine(process.stdout, jsonText(refused));
    return tellRefused(refused, "line 1: ");
  }
  for await (const line of lines) await writeLine(process.stdout, jsonText(answerCell(cells, line, options)));
  return 0;
}

function tellRefused({ error: { path, message } }: Refusal, where: string): number {
  process.stderr.write(`${where}${told(path, message)}\n`);
  return refusedStatus;
}

async function main(): Promise<number> {
  const given = process.argv.slice(2);
  const exploring = readExploreArguments(given);
  if (exploring !== null) return explore(exploring);
  const command: Command | null = readArguments(given);
  if (command === null) {
    process.stdout.write(usage);
    return 0;
  }
  const { file, options, asPython } = command;
  if (file === null) return solveLines(options);
  return asPython ? scriptFile(file, options) : solveFile(file, options);
}

// A reader that has seen enough closes the pipe: that ends the work and is no failure.
process.stdout.on("error", (error: NodeJS.ErrnoException) => process.exit(error.code === "EPIPE" ? 0 : 1));

try {
  process.exitCode = await main();
} catch (error) {
  if (!(error instanceof UsageError)) throw error;
  process.stderr.write(`${error.message}\n\n${usage}`);
  process.exitCode = badUsage;
}

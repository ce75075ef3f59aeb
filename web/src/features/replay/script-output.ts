import type { ReplayDraft } from "@restband/api/contract";
import { quantityNames } from "@restband/solver";

const number = String.raw`(-?(?:\d+(?:\.\d*)?(?:e[+-]?\d+)?|inf|nan))`;
const figures = String.raw`\s+${number}\s+${number}\s+(?:[^\d\s-]\S*(?: m)?\s+)?${number}\s+${number}`;
const quantityLine = new RegExp(String.raw`^(\w+)${figures}`, "u");
const eventLine = new RegExp(String.raw`^(time|place|velocity|friction) of events${figures}\s+at event (\d+),`, "u");
const countLine = /^events: (\d+) claimed, (\d+) found here$/u;
const endLine = /^(agrees|DIFFERS): largest difference/u;
const columns: Readonly<Record<string, string>> = { time: "t", place: "x", velocity: "v", friction: "f" };
const names: ReadonlySet<string> = new Set(quantityNames);

/**
 * Reads what the Python file printed, as somebody pasted it; null where it is no such text or was cut off. Its verdict is
 * worked out anew from its figures.
 */
export function readScriptOutput(text: string, solverVersion: string): ReplayDraft | null {
  const lines = text.split(/\r?\n/u).map((line) => line.trim());
  const end = lines.find((line) => endLine.test(line));
  if (!end) return null;
  const deviations = lines.flatMap((line) => deviationIn(line));
  const differences = lines.flatMap((line) => differenceIn(line));
  if (deviations.length === 0 && differences.length === 0) return null;
  const allowed = 1e-6;
  const agrees = differences.length === 0 && deviations.every(({ relative }) => relative <= allowed);
  return {
    way: "script",
    solverVersion,
    verdict: agrees ? "agrees" : "differs",
    allowed,
    differences,
    deviations: deviations.sort((a, b) => b.relative - a.relative),
    convergence: [],
  };
}

function deviationIn(line: string): ReplayDraft["deviations"] {
  const quantity = quantityLine.exec(line);
  if (quantity && names.has(quantity[1])) {
    const [claimed, found, absolute, relative] = quantity.slice(2, 6).map(Number);
    if (![claimed, found, absolute, relative].every(Number.isFinite)) return [];
    return [{ what: quantity[1], values: [claimed, found], absolute, relative }];
  }
  const event = eventLine.exec(line);
  if (!event) return [];
  const [claimed, found, absolute, relative] = event.slice(2, 6).map(Number);
  return [{ what: columns[event[1]], event: Number(event[6]), values: [claimed, found], absolute, relative }];
}

function differenceIn(line: string): string[] {
  if (line.endsWith("has a value on one side only")) return [`${line.split(/\s/u)[0]} has a value on one side only.`];
  const count = countLine.exec(line);
  if (count && count[1] !== count[2])
    return [`There are ${count[1]} events in the revision and ${count[2]} in the file's run.`];
  return /^event \d+ is \S+ claimed and \S+ here$/u.test(line) ? [`${line}.`] : [];
}

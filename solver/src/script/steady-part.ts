import type { Problem } from "../scenario/problem.ts";
import type { Scenario, Term } from "../scenario/scenario.ts";
import { pythonNumber as n, pythonValue } from "./literals.ts";

/**
 * What the quantities are read over, as Python constants: the steady window's rule, the frequencies among the inputs, the
 * drifts that never end, and the base's travels.
 */
export function steadyPart(scenario: Scenario, problem: Problem): string {
  const { force, base, contact } = scenario;
  const inputs = [...force, ...base];
  const periodic = isPeriodic(inputs);
  const fed = isFed(base);
  const rates = [...inputs.flatMap(hzOf), ...(contact.normal.ripple ? [contact.normal.ripple.hz] : [])];
  const hz = inputs.flatMap(steadyHzOf);
  const drive = periodic && hz.length === 1 ? inputs.find((term) => steadyHzOf(term).length > 0) : undefined;
  return [
    `PERIODIC, FED = ${python(periodic)}, ${python(fed)}`,
    `LOWEST_HZ = ${pythonValue(hz.length > 0 ? Math.min(...hz) : null)}`,
    `FASTEST_HZ = ${n(Math.max(0, ...rates, ...inputs.flatMap(chirpHzOf)))}`,
    `DRIVE_AMPLITUDE = ${amplitudeOf(drive)}`,
    `DRIVEN_BY_BASE = ${python(drive !== undefined && base.includes(drive))}`,
    `STRETCH_RATE = ${stretchRateOf(scenario)}  # of the spring, for ever, while the body is stuck`,
    `FORCE_RATE = ${sum(force.map(endlessRateOf))}`,
    `LOOK_AHEAD = ${lookAheadOf(rates)}`,
    `TRAVELS = [${travelsOf(problem)}]  # of the base: from, to, distance`,
    "",
  ].join("\n");
}

const python = (value: boolean) => (value ? "True" : "False");
const sum = (values: readonly number[]) => n(values.reduce((total, value) => total + value, 0));

const steadyHzOf = (term: Term) => (term.kind === "harmonic" || term.kind === "unbalance" ? [term.hz] : []);
const hzOf = (term: Term) => (term.kind === "pulse" ? [1 / (2 * term.duration)] : steadyHzOf(term));
const chirpHzOf = (term: Term) => (term.kind === "chirp" ? [term.fromHz, term.toHz] : []);

function isPeriodic(inputs: readonly Term[]): boolean {
  return (
    inputs.some((term) => steadyHzOf(term).length > 0) &&
    inputs.every((term) => term.kind === "constant" || steadyHzOf(term).length > 0)
  );
}

function isFed(base: readonly Term[]): boolean {
  return base.some(({ kind }) => kind === "ramp") && base.every(({ kind }) => kind === "ramp" || kind === "constant");
}

function amplitudeOf(drive: Term | undefined): string {
  if (drive?.kind === "harmonic") return n(Math.abs(drive.amplitude));
  if (drive?.kind !== "unbalance") return "None";
  return `${n(Math.abs(drive.mass * drive.eccentricity))} * (TURN * ${n(drive.hz)}) ** 2`;
}

const endlessRateOf = (term: Term) => (term.kind === "ramp" && term.stop === "none" ? term.rate : 0);

function stretchRateOf({ base, contact }: Scenario): string {
  if (contact.counterface === "base") return "0.0";
  const feed = sum(base.map(endlessRateOf));
  return contact.counterface === "ground" ? `-${feed}` : `BELT - ${feed}`;
}

/** One period where there is one frequency, a thousand of the slowest where there are several. */
function lookAheadOf(rates: readonly number[]): string {
  if (rates.length === 0) return "None";
  const slowest = Math.min(...rates);
  return rates.every((hz) => hz === slowest) ? `1.0 / ${n(slowest)}` : `1000.0 / ${n(slowest)}`;
}

function travelsOf({ base }: Problem): string {
  const travels = base.flatMap((term) => term.travels).sort((a, b) => a.from - b.from);
  const end = (value: number) => (value === Infinity ? "INFINITE" : value === -Infinity ? "-INFINITE" : n(value));
  return travels.map(({ from, to, distance }) => `(${n(from)}, ${end(to)}, ${end(distance)})`).join(", ");
}

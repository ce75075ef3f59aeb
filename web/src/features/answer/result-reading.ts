import type { Dimension, Result, Scenario } from "@restband/solver";
import type { Measure } from "../../format/unit.ts";

/** What keeps the body moving: a steady feed of the base, a moving counterface, something that swings, or nothing. */
export type Drive = { kind: "feed" | "belt"; speed: number } | { kind: "periodic" } | { kind: "other" };

/** A result read together with its scenario, as sentences need it. */
export interface ResultReading {
  readonly scenario: Scenario;
  readonly result: Result;
  readonly drive: Drive;
  /** Time of the last event, s. */
  readonly end: number;
  /** A quantity by its name; null where it has no meaning or was not asked for. */
  readonly value: (name: string) => number | null;
  readonly measure: (dimension: Dimension) => Measure;
}

export function readingOf(scenario: Scenario, result: Result): ResultReading {
  return {
    scenario,
    result,
    drive: driveOf(scenario),
    end: result.events[result.events.length - 1]?.t ?? scenario.span.seconds,
    value: (name) => result.quantities[name] ?? null,
    measure: (dimension) => ({ dimension, motion: scenario.motion }),
  };
}

function driveOf({ force, base, contact }: Scenario): Drive {
  const terms = [...force, ...base];
  if (terms.some(({ kind }) => kind === "harmonic" || kind === "unbalance")) return { kind: "periodic" };
  const speed = base.reduce((sum, term) => sum + (term.kind === "ramp" && term.stop === "none" ? term.rate : 0), 0);
  if (speed !== 0) return { kind: "feed", speed };
  return typeof contact.counterface === "object"
    ? { kind: "belt", speed: contact.counterface.velocity }
    : { kind: "other" };
}

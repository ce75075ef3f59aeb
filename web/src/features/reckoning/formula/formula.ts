import type { Bounds, Scenario } from "@restband/solver";
import type { Measure } from "../../../format/unit.ts";

/** A number a formula needs. */
export interface Given<Key extends string = string> extends Bounds {
  readonly key: Key;
  /** As the form labels it: "Core diameter". */
  readonly label: string;
  /** As the formula writes it; what follows "_" is set below the line: "d", "p_0". */
  readonly symbol: string;
  readonly measure: Measure;
  /** What the field starts from, SI; absent: empty. */
  readonly initial?: number;
  /** The unit it starts in, by its label; absent: the customary one. */
  readonly unit?: string;
  /** Where the open scenario already knows it. */
  readonly from?: (scenario: Scenario) => number | undefined;
  readonly help?: string;
}

/** Numbers that go by a name: a material, a thread. Choosing one fills the fields; they stay open to change. */
export interface Preset<Key extends string = string> {
  readonly label: string;
  readonly options: readonly { readonly label: string; readonly values: Readonly<Partial<Record<Key, number>>> }[];
}

export type Values<Key extends string = string> = Readonly<Record<Key, number>>;

/**
 * One way to a value: it describes itself, so that one form draws them all, and shows what it computes.
 * All numbers are SI, angles in degrees.
 */
export interface Formula<Key extends string = string> {
  readonly key: string;
  /** As menus and sentences name it: "Screw shaft, fixed–free". */
  readonly label: string;
  readonly givens: readonly Given<Key>[];
  readonly presets?: readonly Preset<NoInfer<Key>>[];
  readonly result: { readonly symbol: string; readonly measure: Measure };
  /**
   * What is computed, with the givens in braces: "{E} · π · {d}^2 / (4 · {L})". Signs: + − · / ( ) ^, π, exp, ln, √( ).
   * A test evaluates it beside `value`.
   */
  readonly expression: string;
  /** Where the formula is from. */
  readonly source: string;
  /** What it leaves out, in a sentence or two. */
  readonly caveat?: string;
  /** The result, SI. Called with values inside their bounds only. */
  value(values: Values<Key>): number;
  /** What is wrong between numbers that are each right: at which field, and what is asked. */
  fault?(values: Values<NoInfer<Key>>): { readonly key: NoInfer<Key>; readonly message: string } | null;
}

/** Takes the keys of a formula from its givens, so that `value` cannot name one that is not asked for. */
export const formula = <Key extends string>(described: Formula<Key>): Formula => described;

/** The mark of relations every textbook of machine elements has, written down here without one at hand. */
export const textbook = "textbook, from memory";

export const measures = {
  number: { dimension: "none", motion: "linear" },
  length: { dimension: "length", motion: "linear" },
  pressure: { dimension: "pressure", motion: "linear" },
  density: { dimension: "density", motion: "linear" },
  angle: { dimension: "angle", motion: "linear" },
  force: { dimension: "pressing", motion: "linear" },
  torque: { dimension: "force", motion: "angular" },
  springRate: { dimension: "stiffness", motion: "linear" },
  torsionRate: { dimension: "stiffness", motion: "angular" },
  mass: { dimension: "mass", motion: "linear" },
  inertia: { dimension: "inertia", motion: "angular" },
} as const satisfies Record<string, Measure>;

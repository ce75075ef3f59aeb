import type { Formula, Values } from "../formula/formula.ts";

/** One of the ways of a sheet: a formula, and what of the scenario it settles besides its result. */
export interface Way<Key extends string = string> extends Formula<Key> {
  /** How far the result may be off, SI; absent where nothing is known of it. */
  range?(values: Values<Key>): { readonly low: number; readonly high: number };
  /** Other fields that go with the result, each said as "the radius becomes …". */
  also?(values: Values<Key>): readonly { readonly path: string; readonly value: number; readonly words: string }[];
  /** What else follows from these numbers, in sentences. */
  remarks?(values: Values<Key>): readonly string[];
}

/** Takes the keys of a way from its givens. */
export const way = <Key extends string>(described: Way<Key>): Way => described;

/** Several ways to one value. */
export interface Sheet {
  readonly ways: readonly Way[];
  /** What must be known before any of them is used. */
  readonly caution?: string;
}

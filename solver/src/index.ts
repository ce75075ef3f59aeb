/** The door of the solver: all that others may use. */
export { z } from "./scenario/zod.ts";
export * from "./scenario/scenario.ts";
export * from "./result.ts";
export type { Bounds, Dimension, Field } from "./field.ts";
export type { Refusal, SimulateOptions } from "./options.ts";
export type { Choice, ChoiceOption, Rows } from "./field.ts";
export { frictionLaws, lawOf } from "./friction/index.ts";
export type { FrictionLaw } from "./friction/friction-law.ts";
export { excitationTerms, termOf } from "./excitation/index.ts";
export type { ExcitationTerm } from "./excitation/excitation-term.ts";
export { solidDampings, solidOf } from "./solid/index.ts";
export type { SolidDamping } from "./solid/solid-damping.ts";

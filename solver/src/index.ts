/** The door of the solver: all that others may use. */
export { z } from "./scenario/zod.ts";
export * from "./scenario/scenario.ts";
export * from "./result.ts";
export type { Bounds, Dimension, Field } from "./field.ts";
export type { Refusal, SimulateOptions } from "./options.ts";

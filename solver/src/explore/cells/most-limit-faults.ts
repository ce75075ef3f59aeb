import type { Fault, Scenario } from "../../scenario/scenario.ts";
import { mostLimits } from "./cell-row.ts";

/** The fault of a scenario with more limits than a row holds verdicts of. @param what judges them: "A sweep" */
export const mostLimitFaults = (what: string, { limits }: Scenario): Fault[] =>
  limits.length <= mostLimits
    ? []
    : [{ path: "", message: `${what} judges at most ${mostLimits} limits; the scenario has ${limits.length}.` }];

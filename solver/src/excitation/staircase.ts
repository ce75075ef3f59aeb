import type { ExcitationTerm } from "./excitation-term.ts";
import { moveFields, startField } from "./shared-fields.ts";
import { moveDuration, travelProfile } from "./travel-profile.ts";

export interface Staircase {
  kind: "staircase";
  increment: number;
  count: number;
  dwell: number;
  speed: number;
  acceleration: number;
  start: number;
}

/** Equal moves, `dwell` from the start of one to the start of the next. */
export const staircase: ExcitationTerm<"staircase", Staircase> = {
  kind: "staircase",
  label: "Staircase",
  summary: "many equal moves with a wait between",
  places: ["base"],
  sentence: {
    base:
      "The far end of the spring makes {count} steps of {increment}, one every {dwell} from {start} on, " +
      "at {speed} with acceleration {acceleration}",
  },
  fields: [
    { key: "increment", label: "Step", dimension: "displacement", initial: 1e-5, help: "negative goes back" },
    { key: "count", label: "Steps", dimension: "none", minimum: 1, integer: true, initial: 10 },
    {
      key: "dwell",
      label: "Every",
      dimension: "time",
      exclusiveMinimum: 0,
      initial: 0.5,
      help: "from the start of a step to the start of the next",
    },
    ...moveFields,
    startField,
  ],
  source: "trapezoidal speed, common practice",
  faults: ({ increment, dwell, speed, acceleration }) => {
    const duration = moveDuration(increment, speed, acceleration);
    // A dwell equal to the move but for rounding is meant to be equal.
    if (!(dwell < duration * (1 - 1e-12))) return [];
    const message = `A step of this size takes ${duration} s; the next starts after ${dwell} s. Enter ${duration} or more.`;
    return [{ path: "dwell", message }];
  },
  compile: travelProfile,
};

import type { ExcitationTerm } from "./excitation-term.ts";
import { moveFields, startField } from "./shared-fields.ts";
import { moveDuration, travelProfile } from "./travel-profile.ts";

export interface Move {
  kind: "move";
  distance: number;
  speed: number;
  acceleration: number;
  start: number;
}

export const move: ExcitationTerm<"move", Move> = {
  kind: "move",
  label: "Move",
  summary: "goes a distance and stops there",
  places: ["base"],
  sentence: {
    base: "The far end of the spring moves by {distance} from {start} on, at {speed} with acceleration {acceleration}",
  },
  fields: [
    { key: "distance", label: "Distance", dimension: "displacement", initial: 0.01, help: "negative goes back" },
    ...moveFields,
    startField,
  ],
  source: "trapezoidal speed, common practice",
  faults: () => [],
  compile: ({ distance, ...move }) => {
    const dwell = moveDuration(distance, move.speed, move.acceleration);
    return travelProfile({ ...move, increment: distance, count: 1, dwell });
  },
};

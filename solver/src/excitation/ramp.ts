import type { ExcitationTerm } from "./excitation-term.ts";
import { level, line, piecewise } from "./piecewise.ts";
import { startField } from "./shared-fields.ts";
import { stillTerm } from "./still-term.ts";

export interface Ramp {
  kind: "ramp";
  rate: number;
  start: number;
  stop: number | "none";
}

/** rate·(t − start) from start on, held after stop; as a base term a constant feed. */
export const ramp: ExcitationTerm<"ramp", Ramp> = {
  kind: "ramp",
  label: "Ramp",
  summary: "grows at a constant rate; a constant feed on the base",
  places: ["force", "base"],
  sentence: {
    force: "A force grows at {rate} from {start} on",
    base: "The far end of the spring is fed at {rate} from {start} on",
  },
  fields: [
    { key: "rate", label: "Rate", dimension: "forceRate", initial: 10, initialOnBase: 0.002 },
    startField,
    {
      key: "stop",
      label: "Stop",
      dimension: "time",
      optional: true,
      initial: 1,
      clause: " until {stop}, then held",
      help: "left empty, it never stops",
    },
  ],
  source: "by definition",
  faults: ({ start, stop }) => {
    if (stop === "none" || !(stop <= start)) return [];
    return [{ path: "stop", message: `The ramp stops after it starts; it starts at ${start} and stops at ${stop}.` }];
  },
  compile: ({ rate, start, stop }) => {
    const rising = [level(-Infinity, 0), line(start, start, 0, rate)];
    const term = { ...stillTerm, nature: "ramp" } as const;
    if (stop === "none") {
      const travels = rate === 0 ? [] : [{ from: start, to: Infinity, distance: rate * Infinity }];
      return { ...term, ...piecewise(rising), endlessRate: rate, travels };
    }
    const risen = rate * (stop - start);
    const travels = rate === 0 ? [] : [{ from: start, to: stop, distance: risen }];
    return { ...term, ...piecewise([...rising, level(stop, risen)]), travels };
  },
};

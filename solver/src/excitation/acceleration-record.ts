import type { ExcitationTerm } from "./excitation-term.ts";
import { addLine, pointFinder, pointsOf, recordFaults, type RecordTerm, timesColumn } from "./record-term.ts";
import { stillTerm } from "./still-term.ts";

/** ÿ of a shaken floor: straight lines through measured points, zero before and after. */
export const accelerationRecord: ExcitationTerm<"acceleration-record", RecordTerm<"acceleration-record">> = {
  kind: "acceleration-record",
  label: "Acceleration record",
  summary: "a shaken floor, by its measured acceleration",
  places: ["base"],
  sentence: { base: "The floor shakes with a recorded acceleration, {points}, and all motion is told relative to it" },
  fields: [],
  rows: {
    columns: [timesColumn, { key: "values", label: "Acceleration", dimension: "acceleration", initial: 0 }],
    initial: [
      [0, 0],
      [1, 0],
    ],
  },
  source: "measured",
  faults: recordFaults,
  compile: (_term, points) => {
    const { times, values } = pointsOf(points);
    const find = pointFinder(times);
    const last = times.length - 1;
    const isFlat = values.every((value) => value === 0);
    return {
      ...stillTerm,
      nextCorner: (t) => (t < times[last] ? times[find(t) + 1] : Infinity),
      addPolynomial: (t, into) => {
        const i = find(t);
        if (i >= 0 && i < last) addLine(times, values, i, t, into);
      },
      isConstantFrom: (t) => isFlat || t >= times[last],
      isAcceleration: true,
    };
  },
};

import type { ExcitationTerm } from "./excitation-term.ts";
import {
  addLine,
  pointFinder,
  pointsOf,
  recordFaults,
  type RecordTerm,
  timesColumn,
  travelsOf,
} from "./record-term.ts";
import { stillTerm } from "./still-term.ts";

/** Straight lines through measured points, the end values held before and after. */
export const record: ExcitationTerm<"record", RecordTerm<"record">> = {
  kind: "record",
  label: "Record",
  summary: "follows measured points",
  places: ["force", "base"],
  sentence: { force: "A recorded force acts, {points}", base: "The far end of the spring follows a record, {points}" },
  fields: [],
  rows: {
    columns: [timesColumn, { key: "values", label: "Value", dimension: "force", initial: 0 }],
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
    let still = last;
    while (still > 0 && values[still - 1] === values[last]) still--;
    return {
      ...stillTerm,
      nextCorner: (t) => (t < times[last] ? times[find(t) + 1] : Infinity),
      addPolynomial: (t, into) => {
        const i = find(t);
        if (i < 0) into[0] += values[0];
        else if (i === last) into[0] += values[last];
        else addLine(times, values, i, t, into);
      },
      isConstantFrom: (t) => still === 0 || t >= times[still],
      travels: travelsOf(times, values),
    };
  },
};

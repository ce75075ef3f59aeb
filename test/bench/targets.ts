import type { Accuracy } from "./accuracy.ts";

/** What is to be reached, as ratios of figures of one run; `why` is told where it is missed. */
interface Target {
  what: string;
  problems: readonly string[];
  /** Of this way, over that one; a slower yardstick stands above. */
  over: string;
  under: string;
  limit: number;
  isLeast?: true;
  why: string;
}

const plain =
  "each event is judged by rules that know ties, and recorded, so that the run can be read at any instant; the yardstick does neither";
const survey =
  "quantities look at the whole run through ten nodes a half turn, which costs more than closed forms from event to event";

const targets: readonly Target[] = [
  {
    what: "propagation / C",
    problems: ["P1", "P2", "P4"],
    over: "propagation",
    under: "C closed form",
    limit: 1.5,
    why: plain,
  },
  {
    what: "propagation / C",
    problems: ["P5"],
    over: "propagation",
    under: "C closed form",
    limit: 2.5,
    why: "each sample of a record is a segment set up by the general rules, the yardstick one 2 × 2 step of a fixed length",
  },
  {
    what: "CVODE / propagation",
    problems: ["P1", "P2", "P4", "P5"],
    over: "CVODE Adams",
    under: "propagation",
    limit: 200,
    isLeast: true,
    why: "the ratio is that of propagation to C, times what this machine's CVODE takes",
  },
  {
    what: "simulate / propagation",
    problems: ["P1", "P2", "P4", "P5"],
    over: "simulate",
    under: "propagation",
    limit: 4,
    why: survey,
  },
  {
    what: "SciPy / adaptive",
    problems: ["P3"],
    over: "SciPy solve_ivp",
    under: "propagation",
    limit: 4,
    isLeast: true,
    why: "the method is asked for 1e-10 and keeps its steps",
  },
  {
    what: "adaptive / CVODE",
    problems: ["P3"],
    over: "propagation",
    under: "CVODE Adams",
    limit: 3,
    why: "the method is asked for 1e-10, ten times finer, and keeps its steps",
  },
];

/** Largest errors beside forty digits: time in s, place in m. */
const finest: Readonly<Record<string, { t: number; x?: number }>> = {
  P1: { t: 1e-12, x: 1e-14 },
  P2: { t: 1e-12, x: 1e-14 },
  P5: { t: 1e-13 },
};

interface Timed {
  problem: string;
  way: string;
  seconds: number;
}

/** One line for each target that the run can tell: by how much it is met or missed, and why missed. */
export function verdicts(rows: readonly Timed[], accuracy: readonly Accuracy[] | string): string[] {
  const seconds = (problem: string, way: string): number | undefined =>
    rows.find((row) => row.problem === problem && row.way.startsWith(way))?.seconds;
  const ofTimes = targets.flatMap(({ what, problems, over, under, limit, isLeast, why }) =>
    problems.flatMap((problem) => {
      const [above, below] = [seconds(problem, over), seconds(problem, under)];
      if (above === undefined || below === undefined) return [];
      const ratio = above / below;
      const isMet = isLeast ? ratio >= limit : ratio <= limit;
      return [lineOf(`${problem}  ${what}`, ratio, `${isLeast ? "at least" : "at most"} ${limit}`, isMet, why)];
    }),
  );
  return [...ofTimes, ...(typeof accuracy === "string" ? [] : accuracy.flatMap(verdictsOfErrors))];
}

function verdictsOfErrors({ problem, t, x }: Accuracy): string[] {
  const most = finest[problem];
  if (most === undefined) return [];
  const lines = [lineOf(`${problem}  error of t, s`, Number(t), `at most ${most.t}`, Number(t) <= most.t, "")];
  if (most.x === undefined) return lines;
  const why = "a slip starts at a time rounded to the clock's last digit, and goes at its speed";
  return [...lines, lineOf(`${problem}  error of x, m`, Number(x), `at most ${most.x}`, Number(x) <= most.x, why)];
}

function lineOf(what: string, value: number, asked: string, isMet: boolean, why: string): string {
  const told = `${what.padEnd(28)} ${value.toPrecision(3).padStart(9)}  ${asked}`;
  return isMet ? `${told}: met` : `${told}: missed${why === "" ? "" : `, ${why}`}`;
}

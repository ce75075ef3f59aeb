import { checkScenario, type Body, type Contact, type Origin, type Scenario } from "@restband/solver";

/** A case of the trade to begin from, complete and with an answer of its own. A new one is one file in `cases/` and a line in `index.ts`. */
export interface StartingPoint {
  readonly key: string;
  /** Also the title of the scenario. */
  readonly name: string;
  /** What it is for, in one line. */
  readonly why: string;
  /** What its answer shows, with the numbers as they are. */
  readonly shows: string;
  readonly scenario: Scenario;
}

type Defaulted = "incline" | "solid" | "force" | "base" | "initial" | "settleBand";

/** A scenario without what the format has defaults for. */
type Draft = Pick<Scenario, "purpose" | "motion" | "limits" | "origins"> &
  Partial<Pick<Scenario, Defaulted>> & {
    body: Pick<Body, "inertia" | "stiffness"> & Partial<Body>;
    contact: Pick<Contact, "law"> &
      Partial<Pick<Contact, "radius" | "counterface">> & { normal: Partial<Contact["normal"]> & { preload: number } };
    span: Pick<Scenario["span"], "seconds"> & Partial<Scenario["span"]>;
  };

/** Writes out the defaults. Throws where the draft is no scenario: every starting point is checked by the tests. */
export function startingPoint({ draft, ...words }: Omit<StartingPoint, "scenario"> & { draft: Draft }): StartingPoint {
  const { scenario, faults } = checkScenario({ format: "restband-scenario/1", title: words.name, ...draft });
  if (scenario === null) throw new RangeError(`${words.key}: ${faults[0].path}: ${faults[0].message}`);
  return { ...words, scenario };
}

type Range = readonly [low: number, high: number];

const withRange = (origin: Origin, range?: Range): Origin =>
  range ? { ...origin, low: range[0], high: range[1] } : origin;

/** A number of ordinary size in the trade; `what` says what it stands for. */
export const practice = (what: string, range?: Range): Origin =>
  withRange({ kind: "assumed", source: `common practice: ${what}` }, range);

/** A friction coefficient of a published table: the system decides, the table only says the size. */
export const tabled = (source: string, range?: Range): Origin => withRange({ kind: "catalogue", source }, range);

/** A number that follows from others of the case. */
export const calculated = (how: string): Origin => ({ kind: "calculated", source: how });

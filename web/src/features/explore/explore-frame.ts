import type { Scenario } from "@restband/solver";

/** What every part of the explore page works on, and what it can do with what it finds. */
export interface ExploreFrame {
  readonly scenario: Scenario;
  /** Makes a new scenario and opens it; absent where the person may only read. */
  readonly open?: (scenario: Scenario, title: string) => Promise<void>;
}

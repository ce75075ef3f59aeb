import type { Result, Scenario } from "@restband/solver";
import { Caution } from "../../components/caution.tsx";
import { cautionRules } from "./caution-rules.ts";

/** What the answer does not say: always that it is an idealised one, and what the run calls for besides. */
export function Cautions({ scenario, result }: { scenario: Scenario; result: Result | null }) {
  const { holding, dwell } = cautionRules(scenario, result);
  return (
    <Caution>
      <p>
        <strong>An idealised body with one degree of freedom.</strong> The machine has more. Friction changes with wear,
        lubrication, dwell time and temperature.
      </p>
      {dwell && (
        <p>
          Static friction acts here at once at its full value. Where it grows with the time the faces stand still, the
          first jump after a stop can be larger than shown.
        </p>
      )}
      {holding && (
        <p>
          Friction must never be the only thing that holds a load, a person’s safety or an axis against gravity. Use
          brakes, locks or stops and the machinery-safety standards and local codes that apply, and have a licensed
          professional judge designs that can hurt someone.
        </p>
      )}
    </Caution>
  );
}

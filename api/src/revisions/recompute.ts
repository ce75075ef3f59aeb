import {
  type Agreement,
  agreementOf,
  movedInputs,
  type Result,
  type Scenario,
  simulate,
  traceOf,
} from "@restband/solver";
import { type KeptResult, keptResultOf, resultOf, type Trace } from "./revisions-schema.ts";

/** Points of the uniform grid that the trace is thinned from. */
const POINTS = 601;

/** The server's own run of a frozen scenario, and how it stands to what the page says came out. */
export interface Recomputed {
  readonly result: KeptResult;
  readonly trace: Trace;
  readonly agreement: Agreement;
}

/** Why a scenario cannot be computed here, by its field. */
export interface Hindrance {
  readonly path: string;
  readonly message: string;
}

/**
 * Runs a scenario and compares it with what is claimed of it.
 * @param scenario checked, with the points of all its records
 */
export function recompute(scenario: Scenario, claimed: KeptResult): Recomputed | Hindrance {
  const own = simulate(scenario, { samples: POINTS });
  if ("error" in own) return own.error;
  const result = keptResultOf(own);
  const found = agreementOf(resultOf(result), resultOf(claimed), (sign) => rerun(scenario, sign));
  return { result, trace: traceOf(own.samples!), agreement: withCount(found, result, claimed) };
}

function rerun(scenario: Scenario, sign: 1 | -1): Result {
  const result = simulate(movedInputs(scenario, sign), { samples: 0 });
  if ("error" in result) throw new Error(`A moved scenario is refused: ${result.error.message}`);
  return resultOf(keptResultOf(result));
}

/** Events beyond those kept count as well. */
function withCount(
  agreement: Agreement,
  { eventCount: own }: KeptResult,
  { eventCount: claimed }: KeptResult,
): Agreement {
  if (own === claimed) return agreement;
  const verdict = agreement.verdict === "sensitive" ? "sensitive" : "differs";
  return { ...agreement, verdict, differences: [...agreement.differences, `There are ${own} and ${claimed} events.`] };
}

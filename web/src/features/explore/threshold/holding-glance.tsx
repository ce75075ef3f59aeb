import type { HoldingRange, Scenario } from "@restband/solver";
import { Link } from "react-router-dom";
import { exploreField } from "../explore-field.ts";
import { sayTowards } from "../say-value.ts";
import { useHolding } from "./use-holding.ts";

interface HoldingGlanceProps {
  /** Null while a value is being changed: nothing is run then. */
  scenario: Scenario | null;
  /** Where all of it stands. */
  to: string;
}

/** How far the answer holds, in a line under the values it is about; nothing until it is known. */
export function HoldingGlance({ scenario, to }: HoldingGlanceProps) {
  const ranges = useHolding(scenario);
  if (!scenario || ranges === null || ranges.length === 0) return null;
  return (
    <p className="mt-4 max-w-[820px] text-13 text-quiet">
      The answer holds for {ranges.map((range) => rangeWords(range, scenario)).join("; ")}. Each value alone, the others
      as entered.{" "}
      <Link to={to} className="link whitespace-nowrap">
        More of it
      </Link>
    </p>
  );
}

/** "static friction from 0.036 to over 1.5": beyond what was looked at nothing is said but that it holds there. */
function rangeWords({ path, label, dimension, low, high }: HoldingRange, scenario: Scenario): string {
  const measure = { dimension, motion: scenario.motion };
  const from = sayTowards(low.value, measure, "up", { digits: 3 });
  const to = sayTowards(high.value, measure, "down", { digits: 3 });
  const name = exploreField(scenario, path)?.name ?? label;
  return `${name} from ${low.flip ? "" : "under "}${from} to ${high.flip ? "" : "over "}${to}`;
}

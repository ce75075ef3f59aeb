import type { Scenario, SweepPlan } from "@restband/solver";
import { PlainSelect } from "../../../components/select.tsx";
import { quantityNamed } from "../../../format/quantities.ts";
import { limitChoice, type Shown } from "./shown.ts";

interface MapChoiceProps {
  plan: SweepPlan;
  scenario: Scenario;
  choice: string;
  onChoose: (choice: string) => void;
  shown: Shown;
  onLog: (isLog: boolean) => void;
  isBoth: boolean;
  isDown: boolean;
  onBranch: (isDown: boolean) => void;
}

const nameOf = (quantity: string): string => quantityNamed(quantity)?.label ?? quantity;

/** Outcome, a limit or one of the quantities, on which scale; which branch, where there are two. */
export function MapChoice(props: MapChoiceProps) {
  const { plan, scenario, choice, onChoose, shown, onLog, isBoth, isDown, onBranch } = props;
  const choices = [
    { value: "outcome", label: "Outcome" },
    ...scenario.limits.map(({ quantity }, i) => ({ value: limitChoice(i), label: `Limit: ${nameOf(quantity)}` })),
    ...plan.quantities.map((name) => ({ value: name, label: nameOf(name) })),
  ];
  return (
    <>
      <PlainSelect
        aria-label="What the map shows"
        choices={choices}
        value={choice}
        onChange={(event) => onChoose(event.target.value)}
      />
      {shown.kind === "quantity" && shown.canBeLog && (
        <PlainSelect
          aria-label="Scale"
          choices={[
            { value: "even", label: "on an even scale" },
            { value: "log", label: "on a scale of ratios" },
          ]}
          value={shown.isLog ? "log" : "even"}
          onChange={(event) => onLog(event.target.value === "log")}
        />
      )}
      {isBoth && (
        <PlainSelect
          aria-label="Branch"
          choices={[
            { value: "up", label: "on the way up" },
            { value: "down", label: "on the way down" },
          ]}
          value={isDown ? "down" : "up"}
          onChange={(event) => onBranch(event.target.value === "down")}
        />
      )}
    </>
  );
}

import type { SweepPlan } from "@restband/solver";
import { useMemo, useState } from "react";
import { PlainSelect } from "../../../components/select.tsx";
import { quantityNamed } from "../../../format/quantities.ts";
import type { Shown } from "./canvas-cells.tsx";
import type { SweepCells } from "./sweep-cells.ts";

const OUTCOME = "outcome";

/** What the map shows, and the scale it is shown on: the least and the largest value there are. */
export function useShown(cells: SweepCells, edition: number) {
  const [choice, choose] = useState<string>(OUTCOME);
  const shown = useMemo(
    (): Shown =>
      choice === OUTCOME
        ? { kind: "outcome" }
        : scaleOf(
            cells,
            cells.plan.quantities.findIndex((name) => name === choice),
          ),
    // The cells are the same object all along: the edition tells that there are more of them.
    // eslint-disable-next-line react-hooks/exhaustive-deps
    [choice, cells, edition],
  );
  return { choice, shown, choose };
}

function scaleOf(cells: SweepCells, place: number): Shown {
  let [low, high] = [Infinity, -Infinity];
  for (let cell = 0; cell < cells.count; cell++) {
    const value = cells.read(cell)?.quantities[place] ?? null;
    if (value === null) continue;
    low = Math.min(low, value);
    high = Math.max(high, value);
  }
  return low <= high ? { kind: "quantity", place, low, high } : { kind: "quantity", place, low: 0, high: 0 };
}

interface MapChoiceProps {
  plan: SweepPlan;
  choice: string;
  onChoose: (choice: string) => void;
  isBoth: boolean;
  isDown: boolean;
  onBranch: (isDown: boolean) => void;
}

/** Outcome or one of the quantities; which branch, where there are two. */
export function MapChoice({ plan, choice, onChoose, isBoth, isDown, onBranch }: MapChoiceProps) {
  const choices = [
    { value: OUTCOME, label: "Outcome" },
    ...plan.quantities.map((name) => ({ value: name, label: quantityNamed(name)?.label ?? name })),
  ];
  return (
    <>
      <PlainSelect
        aria-label="What the map shows"
        choices={choices}
        value={choice}
        onChange={(event) => onChoose(event.target.value)}
      />
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

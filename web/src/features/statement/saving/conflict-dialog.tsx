import type { StoredScenario } from "@restband/api/contract";
import { useState } from "react";
import { Button } from "../../../components/button.tsx";
import { Dialog, DialogActions } from "../../../components/dialog.tsx";
import { sayClock } from "../../../format/words.ts";
import { differencesOf, merged, type Difference, type Side } from "./differences.ts";
import type { Work } from "./work.ts";

interface ConflictDialogProps {
  /** The version one's own draft began from. */
  base: Work;
  mine: Work;
  /** What somebody else has saved meanwhile. */
  current: StoredScenario;
  onDecide: (work: Work) => void;
}

/** Two people changed the same scenario: both versions field by field, and a choice for each. Nothing is overwritten silently. */
export function ConflictDialog({ base, mine, current, onDecide }: ConflictDialogProps) {
  const differences = differencesOf(base, mine, current);
  const [choices, setChoices] = useState<Readonly<Record<string, Side>>>({});
  const choiceOf = ({ path, likely }: Difference): Side => choices[path] ?? likely;
  const all = (side: Side): void => setChoices(Object.fromEntries(differences.map(({ path }) => [path, side])));
  const decide = (): void =>
    onDecide(merged(mine, current, Object.fromEntries(differences.map((each) => [each.path, choiceOf(each)]))));
  const who = current.updatedBy.name;
  return (
    <Dialog isOpen isWide canClose={false} title="Two versions of this scenario" onClose={() => undefined}>
      <p className="mb-4">
        {who} saved version {current.version} at {sayClock(new Date(current.updatedAt))} while you were editing. Choose
        what stands; nothing is saved until then, and your draft stays in this browser.
      </p>
      <div
        className="max-h-[50vh] overflow-y-auto border-y border-edge"
        tabIndex={0}
        role="region"
        aria-label="Differences"
      >
        {differences.map((difference) => (
          <DifferenceChoice
            key={difference.path}
            difference={difference}
            who={who}
            side={choiceOf(difference)}
            onChoose={(side) => setChoices((before) => ({ ...before, [difference.path]: side }))}
          />
        ))}
      </div>
      <DialogActions>
        <Button kind="primary" onClick={decide}>
          Save this
        </Button>
        <Button onClick={() => all("mine")}>All mine</Button>
        <Button onClick={() => all("theirs")}>All of {who}</Button>
      </DialogActions>
    </Dialog>
  );
}

interface DifferenceChoiceProps {
  difference: Difference;
  who: string;
  side: Side;
  onChoose: (side: Side) => void;
}

function DifferenceChoice({ difference: { path, label, mine, theirs }, who, side, onChoose }: DifferenceChoiceProps) {
  const option = (value: Side, name: string, text: string) => (
    <label className="flex min-h-(--hit) items-start gap-2.5 py-1">
      <input
        type="radio"
        name={path}
        className="mt-1 size-4 shrink-0 accent-slip"
        checked={side === value}
        onChange={() => onChoose(value)}
      />
      <span>
        <span className="text-13 text-quiet">{name}</span> <span className="font-semibold">{text}</span>
      </span>
    </label>
  );
  return (
    <fieldset className="border-b border-line py-3 last:border-b-0">
      <legend className="float-left mb-1 w-full text-15 font-semibold">{label}</legend>
      <div className="clear-both">
        {option("mine", "yours", mine)}
        {option("theirs", who, theirs)}
      </div>
    </fieldset>
  );
}

import { Button } from "../../components/button.tsx";
import { DialogActions } from "../../components/dialog.tsx";
import { PowerText } from "../../components/power-text.tsx";
import { say } from "../../format/format-quantity.ts";
import type { Measure } from "../../format/unit.ts";
import { Symbol } from "./formula/formula-line.tsx";

interface OutcomeProps {
  symbol: string;
  measure: Measure;
  /** Null while something is missing. */
  value: number | null;
  range: { readonly low: number; readonly high: number } | null;
  /** What else the scenario gets with it. */
  also?: string;
  /** What is missing, where it is not simply a number. */
  missing?: string;
  onTake: () => void;
  onClose: () => void;
}

/** What comes out of a reckoning, and the button that takes it into the scenario. */
export function Outcome({ symbol, measure, value, range, also, missing, onTake, onClose }: OutcomeProps) {
  const text = (amount: number): string => say(amount, measure, { digits: 4 });
  return (
    <div className="border-t border-edge pt-4">
      <p aria-live="polite" className="text-24 font-semibold">
        {value === null ? (
          <span className="text-18 font-normal text-quiet">
            {missing ?? "Fill in every number to see what comes out."}
          </span>
        ) : (
          <>
            <Symbol text={symbol} /> = <PowerText text={text(value)} />
          </>
        )}
      </p>
      {value !== null && (range || also) && (
        <p className="mt-1 text-15 text-quiet">
          {range && `Somewhere from ${text(range.low)} to ${text(range.high)}; the range goes along. `}
          {also}
        </p>
      )}
      <DialogActions>
        <Button kind="primary" isBusy={value === null} onClick={onTake}>
          Take it
        </Button>
        <Button onClick={onClose}>Cancel</Button>
      </DialogActions>
    </div>
  );
}

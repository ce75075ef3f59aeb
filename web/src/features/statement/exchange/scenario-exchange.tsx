import type { Scenario } from "@restband/solver";
import { useState } from "react";
import { Dialog } from "../../../components/dialog.tsx";
import { fileNameOf, saveFile } from "../../../components/save-file.ts";
import { announce } from "../../../components/status.tsx";
import type { Dispatch } from "../draft/draft.ts";
import { BringInForm } from "./bring-in-form.tsx";

interface ScenarioExchangeProps {
  /** The scenario in force: what leaves. */
  scenario: Scenario;
  dispatch: Dispatch;
}

/** The scenario as plain JSON: copied, saved to a file, and another brought in. The command line reads the same. */
export function ScenarioExchange({ scenario, dispatch }: ScenarioExchangeProps) {
  const [isOpen, setOpen] = useState(false);
  const text = (): string => `${JSON.stringify(scenario, null, 2)}\n`;
  const copy = async (): Promise<void> => {
    try {
      await navigator.clipboard.writeText(text());
      announce("The scenario is copied as JSON.");
    } catch {
      announce("The browser does not let this page copy. Save it as a file instead.");
    }
  };
  const save = (): void => saveFile(fileNameOf(scenario.title, "json"), "application/json", text());
  const take = (taken: Scenario): void => {
    dispatch({ type: "replace", scenario: taken });
    setOpen(false);
    announce(`“${taken.title || "Untitled"}” is taken.`, () => dispatch({ type: "undo" }));
  };
  return (
    <div className="mt-3 flex flex-wrap items-center gap-x-4 gap-y-1 text-13 text-quiet">
      This scenario as JSON:
      <button type="button" className="link hit" onClick={copy}>
        copy
      </button>
      <button type="button" className="link hit" onClick={save}>
        save as a file
      </button>
      <button type="button" className="link hit" aria-haspopup="dialog" onClick={() => setOpen(true)}>
        bring one in
      </button>
      <Dialog isOpen={isOpen} title="Bring in a scenario" isWide onClose={() => setOpen(false)}>
        <BringInForm onTake={take} />
      </Dialog>
    </div>
  );
}

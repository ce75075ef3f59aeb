import type { Fault } from "@restband/solver";
import { useState, type ReactNode } from "react";
import { Button } from "../../components/button.tsx";
import { ErrorNote } from "../../components/error-note.tsx";
import { FieldError } from "../../components/field.tsx";

interface AskingFormProps {
  /** What its button does: "Run the sweep". */
  act: string;
  faults: readonly Fault[];
  /** True of a fault that stands at a field of its own; the others are told above the button once it was pressed. */
  isPlaced: (path: string) => boolean;
  /** Beside the button while nothing is wrong. */
  remark?: string;
  /** Keeps and opens what is asked; null while it cannot be. */
  onRun: (() => Promise<void>) | null;
  children: ReactNode;
}

/** A question with its button: what is wrong stands at its field, what fails is said, and nothing typed is lost. */
export function AskingForm({ act, faults, isPlaced, remark, onRun, children }: AskingFormProps) {
  const [run, setRun] = useState<{ isTried: boolean; isBusy: boolean; failure: string | null }>({
    isTried: false,
    isBusy: false,
    failure: null,
  });
  const begin = async (): Promise<void> => {
    if (!onRun || run.isBusy) return setRun((old) => ({ ...old, isTried: true }));
    setRun({ isTried: true, isBusy: true, failure: null });
    const failure = await onRun().then(
      () => null,
      (error: unknown) => (error instanceof Error ? error.message : String(error)),
    );
    setRun({ isTried: true, isBusy: false, failure });
  };
  const general = faults.filter(({ path }) => !isPlaced(path));
  return (
    <form
      className="flex flex-col gap-6"
      onSubmit={(event) => {
        event.preventDefault();
        void begin();
      }}
    >
      {children}
      {run.isTried && general.map(({ message }) => <FieldError key={message}>{message}</FieldError>)}
      {run.failure && <ErrorNote>{run.failure}</ErrorNote>}
      <div className="flex flex-wrap items-center gap-4">
        <Button type="submit" kind="primary" isBusy={run.isBusy}>
          {act}
        </Button>
        <span className="text-13 text-quiet">{faults.length > 0 ? toPutRight(faults.length) : remark}</span>
      </div>
    </form>
  );
}

const toPutRight = (count: number): string => `${count} field${count === 1 ? "" : "s"} to put right`;

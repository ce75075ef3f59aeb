import { Button } from "./button.tsx";

interface ProgressLineProps {
  /** What is being done: "Running the scenario". */
  label: string;
  /** 0…1; null while it is not known. */
  fraction: number | null;
  /** "204 of 224 cells · 19 a second · about 2 s left". */
  remark?: string;
  onCancel?: () => void;
}

/** Long work: how far it is, and a way to stop it. */
export function ProgressLine({ label, fraction, remark, onCancel }: ProgressLineProps) {
  const percent = fraction === null ? undefined : Math.round(fraction * 100);
  return (
    <div className="flex flex-wrap items-center gap-x-4 gap-y-2 text-13">
      <div
        role="progressbar"
        aria-label={label}
        aria-valuemin={0}
        aria-valuemax={100}
        aria-valuenow={percent}
        aria-valuetext={remark}
        className="h-2.5 w-48 max-w-full overflow-hidden border border-edge bg-raised"
      >
        <div className="h-full bg-slip" style={{ width: `${percent ?? 0}%` }} />
      </div>
      <span className="text-quiet">{remark ?? (percent === undefined ? label : `${label}, ${percent} %`)}</span>
      {onCancel && <Button onClick={onCancel}>Cancel</Button>}
    </div>
  );
}

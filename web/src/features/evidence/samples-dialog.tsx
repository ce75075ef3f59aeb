import { useState } from "react";
import { Button } from "../../components/button.tsx";
import { Checkbox } from "../../components/choices.tsx";
import { Dialog } from "../../components/dialog.tsx";
import { fileNameOf, saveFile } from "../../components/save-file.ts";
import { PlainSelect } from "../../components/select.tsx";
import { formatNumber } from "../../format/format-number.ts";
import type { RunView } from "./run-view.ts";
import { sampleColumns, samplesCsv, type SampleColumn } from "./samples-csv.ts";

interface SamplesDialogProps {
  view: RunView;
  onClose: () => void;
}

/** Which columns of the samples are saved, and in what units. */
export function SamplesDialog({ view, onClose }: SamplesDialogProps) {
  const { scenario, samples } = view;
  const columns = sampleColumns(samples, scenario);
  const [left, setLeft] = useState<readonly string[]>([]);
  const [units, setUnits] = useState<Readonly<Record<string, string>>>({});
  const unitOf = ({ channel, units: known, usual }: SampleColumn) =>
    known.find(({ label }) => label === units[channel]) ?? usual;
  const chosen = columns.filter(({ channel }) => !left.includes(channel));
  const toggle = (channel: string): void =>
    setLeft(left.includes(channel) ? left.filter((each) => each !== channel) : [...left, channel]);
  const save = (): void => {
    const text = samplesCsv(
      samples,
      chosen.map((column) => ({ column, unit: unitOf(column) })),
    );
    saveFile(fileNameOf(`${scenario.title} samples`, "csv"), "text/csv", text);
    onClose();
  };
  return (
    <Dialog isOpen title="Samples as CSV" onClose={onClose}>
      <p className="mb-4 text-13 text-quiet">{formatNumber(samples.t.length, 7)} rows, one to each sample and event.</p>
      <ul className="mb-5 flex flex-col gap-2">
        {columns.map((column) => (
          <li key={column.channel} className="flex items-center justify-between gap-4">
            <Checkbox
              label={column.name}
              checked={!left.includes(column.channel)}
              onChange={() => toggle(column.channel)}
            />
            {column.units.length > 1 && (
              <PlainSelect
                isQuiet
                aria-label={`Unit of ${column.name}`}
                choices={column.units.map(({ label }) => ({ value: label, label }))}
                value={unitOf(column).label}
                onChange={(event) => setUnits({ ...units, [column.channel]: event.target.value })}
              />
            )}
          </li>
        ))}
      </ul>
      <Button kind="primary" className="self-start" disabled={chosen.length === 0} onClick={save}>
        Save
      </Button>
    </Dialog>
  );
}

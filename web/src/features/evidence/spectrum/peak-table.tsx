import type { SpectralPeak } from "@restband/solver";
import { DataTable, type Column } from "../../../components/data-table.tsx";
import { Figure } from "../../../components/figure.tsx";
import { readQuantity } from "../../../format/format-quantity.ts";
import { unitFor } from "../../../format/units.ts";
import type { RunSpectrum } from "./run-spectrum.ts";
import { orderOf } from "./spectrum-words.ts";

const frequency = { dimension: "frequency", motion: "linear" } as const;

/** The peaks of a spectrum in the order of their frequency. */
export function PeakTable({ spectrum }: { spectrum: RunSpectrum }) {
  const { peaks, measure, window, highest } = spectrum;
  const unit = unitFor(highest, measure);
  const order: Column<SpectralPeak> = {
    key: "order",
    head: "order",
    isFigure: true,
    cell: ({ hz }) => orderOf(hz, window),
  };
  const columns: Column<SpectralPeak>[] = [
    {
      key: "hz",
      head: "Peak at",
      isFigure: true,
      cell: ({ hz }) => <Figure {...readQuantity(hz, frequency, { digits: 4 })} />,
    },
    ...(window.rate ? [order] : []),
    {
      key: "amplitude",
      head: "amplitude",
      isFigure: true,
      cell: ({ amplitude }) => <Figure {...readQuantity(amplitude, measure, { digits: 4, unit })} />,
    },
  ];
  return <DataTable caption="Peaks of the spectrum" columns={columns} rows={peaks} keyOf={({ hz }) => String(hz)} />;
}

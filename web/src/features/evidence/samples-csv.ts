import type { Samples, Scenario } from "@restband/solver";
import Papa from "papaparse";
import { fromSi, type Measure, type Unit } from "../../format/unit.ts";
import { unitFor, unitsOf } from "../../format/units.ts";

type Channel = keyof Samples;

/** A column of samples, and the units it can be written in. */
export interface SampleColumn {
  readonly channel: Channel;
  readonly name: string;
  readonly units: readonly Unit[];
  /** The one that is chosen at first: that of the plots. */
  readonly usual: Unit;
}

const columns: readonly { channel: Channel; name: string; dimension: Measure["dimension"] }[] = [
  { channel: "t", name: "time", dimension: "time" },
  { channel: "x", name: "displacement", dimension: "displacement" },
  { channel: "v", name: "velocity", dimension: "velocity" },
  { channel: "a", name: "acceleration", dimension: "acceleration" },
  { channel: "f", name: "friction on the body", dimension: "force" },
  { channel: "phase", name: "phase (−1 back, 0 stuck, 1 forward)", dimension: "none" },
];

/** All columns samples have, in their order. */
export function sampleColumns(samples: Samples, { motion }: Scenario): SampleColumn[] {
  return columns.map(({ channel, name, dimension }) => {
    const measure = { dimension, motion };
    const largest = samples[channel].reduce((most, value) => Math.max(most, Math.abs(value)), 0);
    const units = channel === "phase" ? unitsOf(measure).slice(0, 1) : unitsOf(measure);
    return {
      channel,
      name,
      units,
      usual: channel === "t" || channel === "phase" ? units[0] : unitFor(largest, measure),
    };
  });
}

/** What is written: a column and its unit. */
export interface ChosenColumn {
  readonly column: SampleColumn;
  readonly unit: Unit;
}

/** Every sample in the chosen columns, all digits, a point for the decimals, the unit in the head. */
export function samplesCsv(samples: Samples, chosen: readonly ChosenColumn[]): string {
  const head = chosen.map(({ column: { name }, unit }) => (unit.label ? `${name}, ${unit.label}` : name));
  const rows = Array.from(samples.t, (_, i) =>
    chosen.map(({ column: { channel }, unit }) => fromSi(samples[channel][i], unit)),
  );
  return `\uFEFF${Papa.unparse([head, ...rows], { escapeFormulae: true })}\r\n`;
}

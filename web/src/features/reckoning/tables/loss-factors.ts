import { printed, type Table, type TableRow } from "./table.ts";

const LOSS = "solid.lossFactor";
const CREMER = "Irvine, after Cremer and Heckl (longitudinal)";
const JOINTS = "damping ratios of a table quoting Adams and Askenazi, doubled (η = 2ζ)";

const row = (
  key: string,
  name: string,
  condition: string,
  span: TableRow["printed"][string],
  more: Pick<TableRow, "source" | "caveat">,
): TableRow => ({
  key,
  name,
  condition,
  printed: { [LOSS]: span },
  ...more,
});

const alone = "material alone";

const rows: readonly TableRow[] = [
  row("aluminium", "Aluminium", alone, printed(3e-6, 1e-4, "0.3–10·10⁻⁵"), { source: CREMER }),
  row("brass", "Brass", alone, printed(2e-4, 1e-3, "0.2–1·10⁻³"), { source: CREMER }),
  row("steel", "Steel", alone, printed(2e-5, 3e-4, "0.2–3·10⁻⁴"), {
    source: CREMER,
    caveat: "Other sources print ten times as much: measure it where it matters.",
  }),
  row("iron", "Iron", alone, printed(1e-4, 4e-4, "1–4·10⁻⁴"), { source: CREMER }),
  row("cast-iron", "Cast iron", alone, printed(1e-2, 1e-2, "order 10⁻²"), { source: "from memory" }),
  row("copper", "Copper", alone, printed(2e-3, 2e-3, "2·10⁻³"), { source: CREMER }),
  row("lead", "Lead", alone, printed(0.05, 0.3, "5–30·10⁻²"), { source: CREMER }),
  row("concrete", "Concrete", alone, printed(1e-2, 1e-2, "order 10⁻²"), { source: "from memory" }),
  row("continuous", "Metal structure, continuous", "as built", printed(0.04, 0.08, "ζ 0.02–0.04"), { source: JOINTS }),
  row("jointed", "Metal structure with joints", "as built", printed(0.06, 0.14, "ζ 0.03–0.07"), {
    source: JOINTS,
    caveat: "Most of it is friction in the joints: it rises with amplitude.",
  }),
  row("rubber", "Rubber", "soft to filled", printed(0.05, 0.5, "about 0.05–0.5 and more"), {
    source: "from memory",
    caveat: "Strongly dependent on temperature, frequency and filler: take the compound’s own sheet.",
  }),
];

/** Loss factors of materials and structures, as public sources print them. */
export const lossFactors: Table = {
  caption: "Loss factors of materials and structures",
  head: "Material",
  columns: [{ path: LOSS, label: "Loss factor" }],
  rows,
  caution:
    "Joints damp far more than the material: a built structure lies tens to hundreds of times above its metal. A loss factor measured on the part itself goes before any table.",
  middle: (low, high) => Math.sqrt(low * high),
  middleWords: "the geometric middle of what is printed, since it spans powers of ten",
};

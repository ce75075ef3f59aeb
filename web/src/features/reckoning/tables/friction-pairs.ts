import { printed, type Table, type TableRow } from "./table.ts";

const STATIC = "contact.law.static";
const KINETIC = "contact.law.kinetic";

const LBL = "table at www-eng.lbl.gov/~ajdemell";
const PICKED = "pickedshares.com";
const GUIDE = "a drive maker’s guide, p. 323 (easymanua.ls)";
const PRESSBOOKS = "pressbooks physics appendix";
const RAILS = "thomsonlinear.com tips; a rail catalogue (flipbuilder czjc, p. 21); r2r.tech/node/898";
const R2R = "r2r.tech/node/898";

const rows: readonly TableRow[] = [
  {
    key: "steel-steel-dry",
    name: "Steel on steel",
    condition: "dry",
    printed: {
      [STATIC]: printed(0.12, 0.8, "0.74; 0.15–0.30; 0.31; 0.45–0.80; 0.12–0.60"),
      [KINETIC]: printed(0.08, 0.7, "0.42; 0.10–0.30; 0.23; 0.40–0.70; 0.08–0.50"),
    },
    source: `${LBL}; ${PICKED}; ${GUIDE}`,
    caveat: "Five figures for one pair, sixfold apart: oxide, humidity and finish decide. Measure it where it matters.",
  },
  {
    key: "steel-steel-lubricated",
    name: "Steel on steel",
    condition: "lubricated",
    printed: { [STATIC]: printed(0.1, 0.35, "0.10; 0.12–0.35"), [KINETIC]: printed(0.04, 0.25, "0.10; 0.04–0.25") },
    source: `${PICKED}; ${GUIDE}`,
  },
  {
    key: "iron-iron-dry",
    name: "Cast iron on cast iron",
    condition: "dry",
    printed: { [STATIC]: printed(1.1), [KINETIC]: printed(0.15) },
    source: LBL,
    caveat:
      "A static figure seven times the kinetic one is that of clean faces that bond; worked ways are far below it.",
  },
  {
    key: "iron-iron-greased",
    name: "Cast iron on cast iron",
    condition: "greased",
    printed: { [KINETIC]: printed(0.07) },
    source: LBL,
  },
  {
    key: "iron-steel-dry",
    name: "Cast iron on steel",
    condition: "dry",
    printed: { [STATIC]: printed(0.18, 0.4, "0.4; 0.18–0.24"), [KINETIC]: printed(0.17, 0.24) },
    source: `${PRESSBOOKS}; ${PICKED}`,
  },
  {
    key: "iron-steel-greased",
    name: "Cast iron on steel",
    condition: "greased or lubricated",
    printed: { [STATIC]: printed(0.1, 0.21, "0.21; 0.10"), [KINETIC]: printed(0.02, 0.21, "0.133; 0.02–0.21") },
    source: `${PRESSBOOKS}; ${PICKED}`,
  },
  {
    key: "bronze-steel-greased",
    name: "Bronze on steel",
    condition: "greased",
    printed: { [STATIC]: printed(0.16) },
    source: `${LBL}; ${PRESSBOOKS}`,
  },
  {
    key: "bronze-iron-dry",
    name: "Bronze on cast iron",
    condition: "dry",
    printed: { [KINETIC]: printed(0.22) },
    source: `${LBL}; ${PRESSBOOKS}`,
  },
  {
    key: "steel-ptfe",
    name: "Steel on PTFE",
    condition: "dry",
    printed: { [STATIC]: printed(0.04, 0.22) },
    source: PICKED,
    caveat: "The source’s table has lost its columns: that these are static figures is likely, not sure.",
  },
  {
    key: "way-liner",
    name: "PTFE way liner filled with bronze",
    condition: "loaded, lubricated ways",
    printed: { [STATIC]: printed(0.015, 0.018, "within 20 % of kinetic"), [KINETIC]: printed(0.015) },
    source: "hon1.ru/?p=501, citing Slocum 1992",
    caveat: "The figure looks low: ask the liner’s maker. Static is reckoned as up to 20 % above the kinetic figure.",
  },
  {
    key: "ptfe-film-greased",
    name: "Thin PTFE film",
    condition: "greased, 60 MPa",
    printed: { [KINETIC]: printed(0.0035, 0.0065) },
    source: "scirp.org paper 64478",
    caveat: "Static friction is printed as below 0.0048, so not above kinetic: at such a load there is hardly a jump.",
  },
  {
    key: "rail-ball",
    name: "Rail guide, balls",
    condition: "of the rolling alone",
    printed: { [KINETIC]: printed(0.002, 0.006, "0.002–0.003; 0.004–0.006; 0.003–0.005") },
    source: RAILS,
    caveat:
      "Seals, preload and grease are not in it: installed, 2 to 5 times the catalogue (r2r.tech). A slow pull test tells.",
  },
  {
    key: "rail-roller",
    name: "Rail guide, rollers",
    condition: "of the rolling alone",
    printed: { [KINETIC]: printed(0.001, 0.004, "0.001–0.002; 0.002–0.004") },
    source: RAILS,
    caveat:
      "Seals, preload and grease are not in it: installed, 2 to 5 times the catalogue (r2r.tech). A slow pull test tells.",
  },
  {
    key: "bush-plain",
    name: "Plain bronze bush",
    condition: "as installed",
    printed: { [KINETIC]: printed(0.1, 0.2, "0.10–0.20") },
    source: R2R,
  },
  {
    key: "bush-lined",
    name: "PTFE-lined bush",
    condition: "as installed",
    printed: { [KINETIC]: printed(0.04, 0.1, "0.04–0.10") },
    source: R2R,
  },
];

/** Coefficients of pairs, as public sources print them. */
export const frictionPairs: Table = {
  caption: "Friction of common pairs",
  head: "Pair",
  columns: [
    { path: STATIC, label: "Static" },
    { path: KINETIC, label: "Kinetic" },
  ],
  rows,
  caution:
    "Friction belongs to the whole system, not to a pair of materials (Blau 2001); a table value holds only where all influences are the same (ISO 7148-1). The sources print these with a warning and disagree with each other: the range goes along, so that the answer is tested over it.",
  middle: (low, high) => (low + high) / 2,
  middleWords: "the middle of what is printed",
};

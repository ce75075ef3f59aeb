import { lawOf, type Scenario } from "@restband/solver";
import { say } from "../../../format/format-quantity.ts";
import { formatNumber } from "../../../format/format-number.ts";
import { measures, textbook, type Given } from "../formula/formula.ts";
import { way, type Sheet, type Way } from "./way.ts";

type Key = "pull" | "friction" | "wrap" | "radius";
type Band = Readonly<Record<Key, number>>;

const radians = (degrees: number): number => (degrees * Math.PI) / 180;

/**
 * Preload N = T (exp(μφ) − 1) / μ of a pad that rubs as much as a band whose drum runs from the anchored to the pulled end:
 * the band helps itself, N.
 * @param pull T on the pulled end, N
 * @param friction μ while sliding, above 0
 * @param wrap φ, degrees
 */
export const preloadHelped = ({ pull, friction, wrap }: Omit<Band, "radius">): number =>
  (pull * Math.expm1(friction * radians(wrap))) / friction;

/** The same where the drum runs from the pulled to the anchored end: N = T (1 − exp(−μφ)) / μ, exp(μφ) times less. */
export const preloadOpposed = ({ pull, friction, wrap }: Omit<Band, "radius">): number =>
  (-pull * Math.expm1(-friction * radians(wrap))) / friction;

/** The coefficient that counts while the drum turns, where the law of the scenario has one. */
function slidingFriction({ contact }: Scenario): number | undefined {
  const { law } = contact;
  return lawOf(law.model).fields.some(({ key }) => key === "kinetic") && "kinetic" in law && law.kinetic > 0
    ? law.kinetic
    : undefined;
}

const givens: readonly Given<Key>[] = [
  { key: "pull", label: "Pull on the band’s end", symbol: "T", measure: measures.force, exclusiveMinimum: 0 },
  {
    key: "friction",
    label: "Kinetic friction",
    symbol: "μ",
    measure: measures.number,
    exclusiveMinimum: 0,
    from: slidingFriction,
    help: "the same as in the contact",
  },
  { key: "wrap", label: "Wrap of the band", symbol: "φ", measure: measures.angle, exclusiveMinimum: 0, initial: 270 },
  {
    key: "radius",
    label: "Radius of the drum",
    symbol: "R",
    measure: measures.length,
    exclusiveMinimum: 0,
    from: ({ contact }) => contact.radius,
  },
];

/** Torque of the drum in each direction, M = μ N R, and how much they differ. */
function torques(band: Band): string[] {
  const torque = (preload: number): string => say(band.friction * preload * band.radius, measures.torque);
  const times = formatNumber(Math.exp(band.friction * radians(band.wrap)));
  return [
    `The band brakes with ${torque(preloadHelped(band))} when it helps itself and with ${torque(preloadOpposed(band))} the other way: ${times} times as much.`,
  ];
}

const bandWay = (described: Pick<Way<Key>, "key" | "label" | "expression" | "value" | "range" | "caveat">): Way =>
  way({
    ...described,
    givens,
    result: { symbol: "N", measure: measures.force },
    source: `${textbook} (Eytelwein)`,
    also: ({ radius }) => [
      { path: "contact.radius", value: radius, words: `the effective radius becomes ${say(radius, measures.length)}` },
      { path: "contact.normal.faces", value: 1, words: "the faces become one" },
    ],
    remarks: torques,
  });

const opposed = "{pull} · (1 − exp(−{friction} · {wrap})) / {friction}";

export const bandBrake: Sheet = {
  ways: [
    bandWay({
      key: "both",
      label: "the drum turns both ways",
      expression: opposed,
      value: preloadOpposed,
      range: (band) => ({ low: preloadOpposed(band), high: preloadHelped(band) }),
      caveat:
        "A pad rubs both ways alike, a band does not. Taken is the weaker direction; the range reaches to the stronger one, so the answer is tested over both.",
    }),
    bandWay({
      key: "helped",
      label: "the drum runs from the anchored to the pulled end: the band helps itself",
      expression: "{pull} · (exp({friction} · {wrap}) − 1) / {friction}",
      value: preloadHelped,
      caveat:
        "Right in this direction alone. Where the rotor swings back the band brakes less than the pad taken here.",
    }),
    bandWay({
      key: "opposed",
      label: "the drum runs from the pulled to the anchored end",
      expression: opposed,
      value: preloadOpposed,
      caveat:
        "Right in this direction alone. Where the rotor swings back the band brakes more than the pad taken here.",
    }),
  ],
  caution:
    "The pull of a band is T(exp(μφ) − 1) and depends on the direction; the pad that stands for it here is right at this μ only, so work it out anew when μ changes. At rest, with a larger μs, the band holds more than the pad. Friction is never the only thing that holds a load or keeps a person safe.",
};

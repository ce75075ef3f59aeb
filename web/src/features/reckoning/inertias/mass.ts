import { formula, measures, textbook } from "../formula/formula.ts";

export const mass = formula({
  key: "mass",
  label: "Mass, weighed or from the drawing",
  givens: [{ key: "mass", label: "Mass", symbol: "m", measure: measures.mass, exclusiveMinimum: 0 }],
  result: { symbol: "m", measure: measures.mass },
  expression: "{mass}",
  source: "weighed or drawn",
  value: ({ mass }) => mass,
});

/**
 * Moment of inertia J = m r² of a mass that goes round at a distance, kg·m².
 * @param mass m, kg
 * @param radius r of its centre from the axis, m
 */
export const orbitingInertia = ({ mass, radius }: Record<"mass" | "radius", number>): number => mass * radius ** 2;

export const orbitingMass = formula({
  key: "orbiting-mass",
  label: "Mass at a distance from the axis",
  givens: [
    { key: "mass", label: "Mass", symbol: "m", measure: measures.mass, exclusiveMinimum: 0 },
    { key: "radius", label: "Distance from the axis", symbol: "r", measure: measures.length, exclusiveMinimum: 0 },
  ],
  result: { symbol: "J", measure: measures.inertia },
  expression: "{mass} · {radius}^2",
  source: textbook,
  caveat: "Small beside its distance; its own moment about its centre comes on top.",
  value: orbitingInertia,
});

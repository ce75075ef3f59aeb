import type { Problem } from "../scenario/problem.ts";

/** y and ẏ of the base, and F, at an instant: right-hand values. */
export interface InputsAt {
  readonly y: number;
  readonly rate: number;
  readonly force: number;
}

/** What acts from outside at t. With an acceleration record all is relative to the base: y and ẏ are then 0. */
export function inputsAt({ base, force, isRelative }: Problem, t: number): InputsAt {
  const moved = isRelative ? { value: 0, rate: 0 } : sumAt(base, t);
  return { y: moved.value, rate: moved.rate, force: sumAt(force, t).value };
}

function sumAt(terms: Problem["base"], t: number): { value: number; rate: number } {
  const polynomial = new Float64Array(4);
  let [value, rate] = [0, 0];
  for (const term of terms) {
    term.addPolynomial(t, polynomial);
    for (const { amplitude, hz, phase, origin } of term.harmonics(t)) {
      const omega = 2 * Math.PI * hz;
      const angle = omega * (t - origin) + phase;
      value += amplitude * Math.cos(angle);
      rate -= amplitude * omega * Math.sin(angle);
    }
  }
  return { value: value + polynomial[0], rate: rate + polynomial[1] };
}

/** The lowest frequency among steady harmonic inputs, Hz; null without one. */
export function lowestInputHz({ force, base }: Problem): number | null {
  const all = [...force, ...base].flatMap(({ hz }) => (hz === null ? [] : [hz]));
  return all.length === 0 ? null : Math.min(...all);
}

/**
 * The free motion of a body on a spring with Coulomb friction, in closed form, for the drawing on the first page. Lengths
 * are in half widths of the rest band, time in half cycles; it starts at rest at `start` > 1.
 *
 * In each half cycle the body swings about a centre that lies `kinetic` away from equilibrium, on the side friction
 * pushes it to: x(τ) = centre + (from − centre) cos πτ. Each swing is 2·kinetic shorter; the first that ends inside the
 * band is the last. Textbook result, from memory.
 */
export interface Swing {
  from: number;
  centre: number;
  to: number;
}

/** All swings from `start` to rest; `kinetic` is μk/μs, in (0, 1]. */
export function swingsToRest(start: number, kinetic: number): Swing[] {
  const swings: Swing[] = [];
  for (let from = start; Math.abs(from) > 1;) {
    const centre = Math.sign(from) * kinetic;
    const to = 2 * centre - from;
    swings.push({ from, centre, to });
    from = to;
  }
  return swings;
}

/** Points [τ, x] of those swings, `perSwing` of them to each, then the rest position. */
export function decayPoints(swings: readonly Swing[], perSwing: number): [number, number][] {
  const moving = swings.flatMap(({ from, centre }, n) =>
    Array.from({ length: perSwing }, (_, i): [number, number] => {
      const part = i / perSwing;
      return [n + part, centre + (from - centre) * Math.cos(Math.PI * part)];
    }),
  );
  return [...moving, [swings.length, swings[swings.length - 1].to]];
}

import { uniformFloat64 } from "pure-rand/distribution/uniformFloat64";
import { xoroshiro128plus } from "pure-rand/generator/xoroshiro128plus";

/** Numbers evenly spread over [0, 1), multiples of 2⁻⁵³. */
export type Random = () => number;

/** A stream of random numbers: the same seed, a whole number, gives the same stream everywhere (xoroshiro128+). */
export function randomFrom(seed: number): Random {
  const generator = xoroshiro128plus(seed);
  return () => uniformFloat64(generator);
}

/** A random order of the numbers 0…count − 1 (Fisher & Yates, in Durstenfeld's form of 1964). */
export function shuffled(count: number, random: Random): Uint32Array {
  const order = Uint32Array.from({ length: count }, (_, i) => i);
  for (let i = count - 1; i > 0; i--) {
    const j = Math.floor(random() * (i + 1));
    [order[i], order[j]] = [order[j], order[i]];
  }
  return order;
}

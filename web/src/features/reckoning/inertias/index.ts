import type { Formula } from "../formula/formula.ts";
import { block } from "./block.ts";
import { mass, orbitingMass } from "./mass.ts";
import { cylinder, rotor } from "./rotor.ts";

/** Everything a sum of inertias can be made of, in the order menus show it. */
export const inertias: readonly Formula[] = [mass, block, rotor, cylinder, orbitingMass];

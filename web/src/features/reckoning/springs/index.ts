import type { Formula } from "../formula/formula.ts";
import { beams } from "./beam.ts";
import { belt } from "./belt.ts";
import { bearing, coupling, mount, nut, torsionMember } from "./catalogue.ts";
import { helicalSpring } from "./helical-spring.ts";
import { padPressed, padSheared } from "./pad.ts";
import { rod } from "./rod.ts";
import { screwFixedFixed, screwFixedFree } from "./screw-shaft.ts";
import { torsionShaft } from "./torsion-shaft.ts";

/** Everything a stiffness chain can be made of, in the order menus show it. Keys live in what people have open. */
export const springs: readonly Formula[] = [
  screwFixedFree,
  screwFixedFixed,
  nut,
  bearing,
  mount,
  belt,
  rod,
  ...beams,
  helicalSpring,
  padPressed,
  padSheared,
  torsionShaft,
  coupling,
  torsionMember,
];

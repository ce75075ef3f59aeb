import { angularSketch } from "./angular-sketch.ts";
import { bandScale } from "./band-scale.ts";
import { linearSketch } from "./linear-sketch.ts";
import { boundsOf, moved, type Shape } from "./sketch-shapes.ts";
import type { SketchState } from "./sketch-state.ts";

export interface SketchLayout {
  readonly shapes: readonly Shape[];
  readonly height: number;
}

const edge = 2;
const between = 20;

/** The machine above, its scale beneath, within a width in CSS pixels. */
export function sketchLayout(state: SketchState, width: number): SketchLayout {
  const machine = (state.scenario.motion === "angular" ? angularSketch : linearSketch)(state, width);
  const box = boundsOf(machine);
  const placed = moved(machine, acrossOf(box.left, box.right, width), edge - box.top);
  const top = box.bottom - box.top + edge + between;
  const scale = bandScale(state, width);
  return { shapes: [...placed, ...moved(scale, 0, top)], height: Math.ceil(top + boundsOf(scale).bottom + edge) };
}

/** Centres a drawing that is narrower than its width; one that is as wide keeps its left end. */
const acrossOf = (left: number, right: number, width: number): number =>
  Math.max(0, (width - (right - left)) / 2) - left;

import type { Samples, Scenario } from "@restband/solver";
import { useMemo } from "react";
import { inputsOf } from "../../compute/inputs.ts";
import { useWidth } from "../../components/use-width.ts";
import { say } from "../../format/format-quantity.ts";
import { sketchLayout } from "./sketch-layout.ts";
import { ShapeMark } from "./shape-mark.tsx";
import { sketchRange, sketchState } from "./sketch-state.ts";
import { sketchWords } from "./sketch-words.ts";

interface BodySketchProps {
  scenario: Scenario;
  samples: Samples;
  /** The shared time cursor, s. */
  t: number;
}

/** The scenario as a line drawing, standing as the body stands at the cursor, with the rest band on a scale beneath. */
export function BodySketch({ scenario, samples, t }: BodySketchProps) {
  const [ref, width] = useWidth<HTMLDivElement>(380);
  const inputs = useMemo(() => inputsOf(scenario), [scenario]);
  const range = useMemo(() => sketchRange(scenario, inputs, samples), [scenario, inputs, samples]);
  const state = sketchState(scenario, inputs, samples, range, t);
  const { shapes, height } = sketchLayout(state, width);
  return (
    <figure>
      <div ref={ref}>
        <svg width={width} height={height} role="img" aria-label={sketchWords(state)} className="block">
          {shapes.map((shape, i) => (
            <ShapeMark key={i} shape={shape} />
          ))}
        </svg>
      </div>
      <figcaption className="text-right text-13 text-quiet">
        drawn at the cursor, {say(t, { dimension: "time", motion: scenario.motion }, { digits: 4 })}
      </figcaption>
    </figure>
  );
}

import type { Result, Samples } from "@restband/solver";

/** A result without what no row shows: of the samples those where the phase changes, of the events the last. */
export function slim(result: Result): Result {
  return { ...result, events: result.events.slice(-1), samples: result.samples && phaseChanges(result.samples) };
}

function phaseChanges(samples: Samples): Samples {
  const { phase } = samples;
  const kept = [...phase.keys()].filter((i) => i === 0 || i === phase.length - 1 || phase[i] !== phase[i - 1]);
  const pick = (values: Float64Array): Float64Array => Float64Array.from(kept, (i) => values[i]);
  return {
    t: pick(samples.t),
    x: pick(samples.x),
    v: pick(samples.v),
    a: pick(samples.a),
    f: pick(samples.f),
    phase: pick(samples.phase),
  };
}

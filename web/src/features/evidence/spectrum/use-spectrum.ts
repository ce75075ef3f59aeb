import { useMemo } from "react";
import type { RunOptions } from "../../../compute/solver-job.ts";
import { useRun } from "../../../compute/use-run.ts";
import type { Range } from "../part-of-run.ts";
import type { RunView } from "../run-view.ts";
import { runSpectrum, type RunSpectrum, type SpectrumChannel } from "./run-spectrum.ts";
import { spectrumWindow, type WindowPart } from "./spectrum-window.ts";

interface SpectrumState {
  /** Null until it is computed, and where there is none. */
  readonly spectrum: RunSpectrum | null;
  /** Why there is none, as a sentence; null while there is one or it is on its way. */
  readonly trouble: string | null;
}

const nothingElse = { samples: 0, quantities: [], events: false, energy: false } as const satisfies RunOptions;

/** The spectrum of a part of a run. The run is computed once more for it, at even instants: what is drawn above stands at uneven ones. */
export function useSpectrum(view: RunView, part: WindowPart, seen: Range, channel: SpectrumChannel): SpectrumState {
  const { scenario } = view;
  const window = useMemo(() => spectrumWindow(view, part, seen), [view, part, seen]);
  const options = useMemo(() => {
    if (!window) return nothingElse;
    const { from, to, count } = window;
    return { ...nothingElse, evenly: { from, to, count } };
  }, [window]);
  const { computed, isStale, failure } = useRun(window ? scenario : null, options);
  const spectrum = useMemo(() => {
    if (!window || isStale || !computed || !("result" in computed)) return null;
    return runSpectrum(computed.scenario, computed.result.at, window, channel);
  }, [window, isStale, computed, channel]);
  const trouble = window ? failure : "The run lasts no time: there is nothing to tell a spectrum of.";
  return { spectrum, trouble };
}

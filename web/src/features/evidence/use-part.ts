import { useMemo, useState } from "react";
import { useShortcut } from "../../components/shortcuts.tsx";
import { between, following, isWhole, panned, zoomed, type Range } from "./part-of-run.ts";

/** The part of the run that all time panels show, and what changes it. */
export interface SeenPart {
  readonly range: Range;
  /** Null: the whole run, also when it becomes longer. */
  readonly choose: (range: Range | null) => void;
  /** `factor` below 1: closer, about an instant, the cursor's unless told. */
  readonly zoom: (factor: number, about?: number) => void;
  /** Along by a share of what is seen. */
  readonly pan: (share: number) => void;
  /** What lies between two instants, in either order. */
  readonly span: (one: number, other: number) => void;
  /** Moves what is seen so that the instant is in it. */
  readonly follow: (t: number) => void;
}

/** The part seen, with the keys + − [ ] 0 and Page up and down. `t`: the cursor's time. */
export function useSeenPart(whole: number, t: number): SeenPart {
  const [chosen, setChosen] = useState<Range | null>(null);
  const range = useMemo(() => within(chosen, whole), [chosen, whole]);
  const set = (next: Range): void => setChosen(isWhole(next, whole) ? null : next);
  const part: SeenPart = {
    range,
    choose: setChosen,
    zoom: (factor, about) => set(zoomed(range, whole, about ?? t, factor)),
    pan: (share) => set(panned(range, whole, share * (range.to - range.from))),
    span: (one, other) => set(between(one, other, whole)),
    follow: (instant) => set(following(range, whole, instant)),
  };
  useShortcut("+", "Closer about the cursor", () => part.zoom(0.5));
  useShortcut("-", "Wider", () => part.zoom(2));
  useShortcut("[", "See from the cursor on", () => part.span(t, t < range.to ? range.to : whole));
  useShortcut("]", "See up to the cursor", () => part.span(t > range.from ? range.from : 0, t));
  useShortcut("0", "The whole run", () => part.choose(null));
  return part;
}

/** The chosen part as far as the run reaches; the whole run where nothing of it is left. */
export function within(part: Range | null, end: number): Range {
  if (!part || part.from >= end) return { from: 0, to: end };
  return { from: part.from, to: Math.min(part.to, end) };
}

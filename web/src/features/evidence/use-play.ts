import { useEffect, useRef, useState } from "react";
import { useMedia } from "../../components/use-media.ts";
import type { Range } from "./part-of-run.ts";

/** How long the part seen takes to play, s; "real": as long as the motion itself. */
export type Pace = "5" | "10" | "30" | "real";

export const paces: readonly { value: Pace; label: string }[] = [
  { value: "5", label: "in 5 s" },
  { value: "10", label: "in 10 s" },
  { value: "30", label: "in 30 s" },
  { value: "real", label: "in real time" },
];

/** A person who wants no motion sees events one after the other instead, this many ms apart. */
const STEP_MS = 1000;

interface Playing {
  readonly range: Range;
  readonly t: number;
  readonly onMove: (t: number) => void;
  /** The event after an instant; null after the last. */
  readonly next: (t: number) => number | null;
}

export interface Play {
  readonly isPlaying: boolean;
  readonly pace: Pace;
  readonly setPace: (pace: Pace) => void;
  readonly toggle: () => void;
  readonly stop: () => void;
}

/** Moves the cursor through the part seen and stops at its end. */
export function usePlay(playing: Playing): Play {
  const [isPlaying, setPlaying] = useState(false);
  const [pace, setPace] = useState<Pace>("10");
  const isStill = useMedia("(prefers-reduced-motion: reduce)");
  const latest = useRef(playing);
  useEffect(() => {
    latest.current = playing;
  });
  useEffect(() => {
    if (!isPlaying) return;
    const advance = (t: number): boolean => {
      const { range, onMove } = latest.current;
      onMove(Math.min(t, range.to));
      if (t >= range.to) setPlaying(false);
      return t < range.to;
    };
    return isStill ? byEvents(() => latest.current, advance) : smoothly(pace, () => latest.current, advance);
  }, [isPlaying, isStill, pace]);
  const toggle = (): void => {
    const { range, t, onMove } = playing;
    if (!isPlaying && (t >= range.to || t < range.from)) onMove(range.from);
    setPlaying(!isPlaying);
  };
  return { isPlaying, pace, setPace, toggle, stop: () => setPlaying(false) };
}

/** A frame of the screen at a time; a cursor that was put elsewhere goes on from there. */
function smoothly(pace: Pace, now: () => Playing, advance: (t: number) => boolean): () => void {
  let before = performance.now();
  let frame = requestAnimationFrame(tick);
  function tick(time: number): void {
    const { range, t } = now();
    const perSecond = pace === "real" ? 1 : (range.to - range.from) / Number(pace);
    const goesOn = advance(t + (perSecond * Math.max(0, time - before)) / 1000);
    before = time;
    if (goesOn) frame = requestAnimationFrame(tick);
  }
  return () => cancelAnimationFrame(frame);
}

function byEvents(now: () => Playing, advance: (t: number) => boolean): () => void {
  const timer = setInterval(() => {
    const { range, t, next } = now();
    advance(next(t) ?? range.to);
  }, STEP_MS);
  return () => clearInterval(timer);
}

import { useEffect, useRef, type RefObject } from "react";
import { plotWidth, timeAt, type Frame } from "./frame.ts";
import type { SeenPart } from "./use-part.ts";

/** A notch of the wheel is about 100 px: it makes what is seen a quarter wider or closer. */
const PER_PIXEL = 0.0022;

/**
 * Wheel and fingers on the time panels: Ctrl and the wheel (two fingers on a pad) closer and wider about the pointer,
 * Shift and the wheel or a sideways roll along. The plain wheel goes on rolling the page. Two fingers on a screen do both.
 */
export function useGestures(frame: Frame, part: SeenPart): RefObject<HTMLDivElement | null> {
  const area = useRef<HTMLDivElement>(null);
  const latest = useRef({ frame, part });
  useEffect(() => {
    latest.current = { frame, part };
  });
  useEffect(() => {
    const element = area.current;
    if (!element) return;
    const roll = (event: WheelEvent): void => rolled(event, element, latest.current);
    const pinch = pinching(element, () => latest.current);
    // Listeners of React are passive here: they could not keep the page from rolling.
    element.addEventListener("wheel", roll, { passive: false });
    element.addEventListener("touchmove", pinch.move, { passive: false });
    element.addEventListener("touchend", pinch.end);
    return () => {
      element.removeEventListener("wheel", roll);
      element.removeEventListener("touchmove", pinch.move);
      element.removeEventListener("touchend", pinch.end);
    };
  }, []);
  return area;
}

interface Now {
  readonly frame: Frame;
  readonly part: SeenPart;
}

function rolled(event: WheelEvent, element: HTMLElement, { frame, part }: Now): void {
  const along = event.shiftKey && event.deltaX === 0 ? event.deltaY : event.deltaX;
  if (event.ctrlKey) {
    event.preventDefault();
    const x = event.clientX - element.getBoundingClientRect().left;
    part.zoom(Math.exp(event.deltaY * PER_PIXEL), timeAt(frame, x));
  } else if (Math.abs(along) > Math.abs(event.shiftKey ? 0 : event.deltaY)) {
    event.preventDefault();
    part.pan(along / plotWidth(frame));
  }
}

/** Two fingers: apart makes it closer about their middle, sideways moves it along. */
function pinching(element: HTMLElement, now: () => Now) {
  let before: { spread: number; middle: number } | null = null;
  const move = (event: TouchEvent): void => {
    if (event.touches.length !== 2) return;
    event.preventDefault();
    const [a, b] = [event.touches[0].clientX, event.touches[1].clientX];
    const next = { spread: Math.max(20, Math.abs(a - b)), middle: (a + b) / 2 - element.getBoundingClientRect().left };
    const { frame, part } = now();
    if (before && Math.abs(next.spread - before.spread) > 1)
      part.zoom(before.spread / next.spread, timeAt(frame, next.middle));
    else if (before) part.pan((before.middle - next.middle) / plotWidth(frame));
    before = next;
  };
  return { move, end: () => (before = null) };
}

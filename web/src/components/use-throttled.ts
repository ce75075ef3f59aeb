import { useEffect, useRef, useState } from "react";
import { afterPaint } from "./after-paint.ts";

/**
 * A value that follows another at most every `every` ms, never before what changed with that other is painted, and always
 * ends at the newest.
 */
export function useThrottled<T>(value: T, every: number): T {
  const [shown, setShown] = useState(value);
  const newest = useRef(value);
  const last = useRef(-Infinity);
  const waiting = useRef<(() => void) | null>(null);
  useEffect(() => {
    if (Object.is(value, newest.current)) return;
    newest.current = value;
    // What waits already takes the newest: one that changes with every frame does not put it off for ever.
    waiting.current ??= afterPaint(Math.max(0, last.current + every - performance.now()), () => {
      waiting.current = null;
      last.current = performance.now();
      setShown(() => newest.current);
    });
  }, [value, every]);
  useEffect(
    () => () => {
      waiting.current?.();
      waiting.current = null;
    },
    [],
  );
  return shown;
}

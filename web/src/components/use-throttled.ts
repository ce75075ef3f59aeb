import { useEffect, useRef, useState } from "react";

/** A value that follows another at most every `every` ms, and always ends at the newest. */
export function useThrottled<T>(value: T, every: number): T {
  const [shown, setShown] = useState(value);
  const last = useRef(0);
  useEffect(() => {
    const wait = Math.max(0, last.current + every - performance.now());
    const timer = setTimeout(() => {
      last.current = performance.now();
      setShown(() => value);
    }, wait);
    return () => clearTimeout(timer);
  }, [value, every]);
  return shown;
}

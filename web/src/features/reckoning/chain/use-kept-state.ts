import { useState } from "react";

/** What was left on the page, by name; gone with the tab. */
const kept = new Map<string, unknown>();

/** State that outlives its component under a name: a dialog closed by a slip of the hand opens as it was left. */
export function useKeptState<T>(name: string, initial: () => T): [T, (next: T) => void] {
  const [state, setState] = useState<T>(() => (kept.has(name) ? (kept.get(name) as T) : initial()));
  const set = (next: T): void => {
    kept.set(name, next);
    setState(next);
  };
  return [state, set];
}

import { useSyncExternalStore } from "react";

/** Converts one of a unit into another, both in the library's spelling; throws for unknown and for incompatible units. */
export type Convert = (from: string, to: string) => number;

// The library is larger than everything else here, and nearly always our own table is enough: it comes after the page.
let convert: Convert | null = null;
let isComing = false;
const listeners = new Set<() => void>();

/** The library of all units beyond our own table; null until it is there, which is asked for again then. */
export function otherUnits(): Convert | null {
  if (!convert) void loadOtherUnits();
  return convert;
}

/** Fetches the library; where it does not come, the next that needs it tries again. */
export async function loadOtherUnits(): Promise<void> {
  if (convert || isComing) return;
  isComing = true;
  try {
    const { default: Qty } = await import("js-quantities");
    convert = (from, to) => Qty(1, from).to(to).scalar;
    for (const tell of listeners) tell();
  } catch {
    // No server: units of our own table are read all the same.
  } finally {
    isComing = false;
  }
}

/** Whether all units can be read by now; renders anew when they can. */
export const useOtherUnits = (): boolean => useSyncExternalStore(subscribe, () => convert !== null);

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

import { useState } from "react";
import type { ExtraPanel } from "./frame.ts";

const storageKey = "restband-panels";

/** The panels added to the figure; remembered by this browser. */
export function usePanels(): [readonly ExtraPanel[], (panel: ExtraPanel) => void] {
  const [panels, setPanels] = useState(read);
  const toggle = (panel: ExtraPanel): void => {
    const next = panels.includes(panel) ? panels.filter((each) => each !== panel) : [...panels, panel];
    setPanels(next);
    try {
      localStorage.setItem(storageKey, next.join(" "));
    } catch {
      // Storage is refused: the choice lasts as long as the page.
    }
  };
  return [panels, toggle];
}

function read(): readonly ExtraPanel[] {
  try {
    const kept = (localStorage.getItem(storageKey) ?? "").split(" ");
    return (["acceleration", "drive"] as const).filter((panel) => kept.includes(panel));
  } catch {
    return [];
  }
}

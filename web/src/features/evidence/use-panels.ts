import { useState } from "react";

const storageKey = "restband-panels";
const extras = ["acceleration", "drive", "spectrum"] as const;

/** What a person adds to the figures that are always there: panels over time, and the spectrum. */
export type Extra = (typeof extras)[number];

/** The figures added; remembered by this browser. */
export function usePanels(): [readonly Extra[], (panel: Extra) => void] {
  const [panels, setPanels] = useState(read);
  const toggle = (panel: Extra): void => {
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

function read(): readonly Extra[] {
  try {
    const kept = (localStorage.getItem(storageKey) ?? "").split(" ");
    return extras.filter((panel) => kept.includes(panel));
  } catch {
    return [];
  }
}

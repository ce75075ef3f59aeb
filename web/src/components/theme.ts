import { sharedValue, useSharedValue } from "../shared-value.ts";

export type Theme = "light" | "dark";

// `public/theme.js` reads the same key before the first paint.
const key = "restband-theme";
const shown = sharedValue<Theme>(document.documentElement.dataset.theme === "dark" ? "dark" : "light");
const system = () => window.matchMedia?.("(prefers-color-scheme: dark)");

/** The theme a person chose, or null where the page follows the system. */
export function chosenTheme(): Theme | null {
  try {
    const chosen = localStorage.getItem(key);
    return chosen === "light" || chosen === "dark" ? chosen : null;
  } catch {
    return null;
  }
}

/** The theme now in force. */
export function currentTheme(): Theme {
  return chosenTheme() ?? (system()?.matches ? "dark" : "light");
}

/** Puts a theme in force and remembers it; null follows the system again. */
export function chooseTheme(theme: Theme | null): void {
  try {
    if (theme) localStorage.setItem(key, theme);
    else localStorage.removeItem(key);
  } catch {
    // Storage is refused: the choice lasts as long as the page.
  }
  apply(theme ?? currentTheme());
}

function apply(theme: Theme): void {
  document.documentElement.dataset.theme = theme;
  shown.set(theme);
}

/** Lets the page follow the system's own change from light to dark, and a choice made in another tab. */
export function followSystemTheme(): void {
  const follow = () => apply(currentTheme());
  system()?.addEventListener("change", follow);
  window.addEventListener("storage", (event) => event.key === key && follow());
}

/** The theme the page shows, and a new render when it changes: for drawings that read the tokens. */
export const useTheme = () => useSharedValue(shown);

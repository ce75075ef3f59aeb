import { useMemo } from "react";
import { useTheme } from "./theme.ts";
import { useMedia } from "./use-media.ts";

const names = [
  "paper",
  "raised",
  "line",
  "edge",
  "ink",
  "quiet",
  "slip",
  "stick",
  "broken",
  "band",
  "band-line",
  "measured",
] as const;

/** The tokens as colours a drawing library can read. */
export type PlotTheme = Record<(typeof names)[number], string> & { text: string; mono: string };

/** The tokens in force, read anew when the theme, contrast or the system's own colours change. */
export function usePlotTheme(): PlotTheme {
  const theme = useTheme();
  const isForced = useMedia("(forced-colors: active)");
  const isStrong = useMedia("(prefers-contrast: more)");
  // The tokens are read from the page: what they hang on stands for them.
  return useMemo(readTheme, [theme, isForced, isStrong]);
}

/** Colours are resolved by the browser itself: a token may be a system colour. */
function readTheme(): PlotTheme {
  const probe = document.createElement("span");
  document.body.append(probe);
  const colour = (name: string): string => {
    probe.style.color = `var(--${name})`;
    return getComputedStyle(probe).color;
  };
  const root = getComputedStyle(document.documentElement);
  const theme = Object.fromEntries(names.map((name) => [name, colour(name)])) as PlotTheme;
  probe.remove();
  return { ...theme, text: root.getPropertyValue("--text"), mono: root.getPropertyValue("--mono") };
}

/** A colour of the theme, let through to `share` (0…1). */
export function faded(colour: string, share: number): string {
  return colour.replace(
    /^rgba?\((\d+), (\d+), (\d+).*\)$/,
    (_, r: string, g: string, b: string) => `rgba(${r}, ${g}, ${b}, ${share})`,
  );
}

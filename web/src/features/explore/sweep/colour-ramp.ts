import type { PlotTheme } from "../../../components/plot-theme.ts";

const STEPS = 32;

/** From the sheet's own colour to the slip colour: a scale of one hue, so that lightness alone tells the order. */
export function rampColours(theme: PlotTheme): string[] {
  const [from, to] = [theme.raised, theme.slip].map(channelsOf);
  return Array.from({ length: STEPS }, (_, i) => {
    const share = 0.06 + (0.94 * i) / (STEPS - 1);
    const [r, g, b] = from.map((value, k) => Math.round(value + share * (to[k] - value)));
    return `rgb(${r}, ${g}, ${b})`;
  });
}

const channelsOf = (colour: string): number[] => (colour.match(/[\d.]+/g) ?? ["0", "0", "0"]).slice(0, 3).map(Number);

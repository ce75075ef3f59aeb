import { indexAt } from "../../compute/instant.ts";
import { say } from "../../format/format-quantity.ts";
import { plotWidth, timeAt, yOf, type Frame, type PanelFrame, type PanelKey } from "./frame.ts";
import { overlayAt, type Overlay } from "./overlay.ts";
import type { RunView } from "./run-view.ts";
import { driveSpeed } from "./scales.ts";

/** A word at a line of the panels, px from the figure's top left to its baseline. */
export interface PanelLabel {
  readonly key: string;
  readonly text: string;
  readonly x: number;
  readonly y: number;
  readonly anchor: "start" | "middle" | "end";
  readonly tone: "band-line" | "quiet" | "stick";
}

/** Room above and below a line's word, px. */
const RISE = 6;
const FALL = 16;

/** What the body's curves are measured against, named at its own line; and every other motion at its own. */
export function panelLabels(view: RunView, frame: Frame, overlays: readonly Overlay[]): PanelLabel[] {
  const find = (key: PanelKey): PanelFrame | undefined => frame.panels.find((panel) => panel.key === key);
  const [displacement, velocity, friction] = [find("displacement"), find("velocity"), find("friction")];
  return [
    ...(displacement ? bandLabel(view, frame, displacement) : []),
    ...(displacement ? overlayLabels(view, frame, displacement, overlays) : []),
    ...(velocity ? speedLabel(view, frame, velocity) : []),
    // Beside the panels it stands in the gutter.
    ...(friction && frame.right < 100 ? holdLabel(view, frame, friction) : []),
  ];
}

/** Above the band's upper edge, or within the band where that is at the panel's; left out where the curve leaves no room. */
function bandLabel({ inputs, scenario, samples }: RunView, frame: Frame, panel: PanelFrame): PanelLabel[] {
  const { equilibrium, restBand } = inputs;
  if (restBand === null || inputs.times(frame.from, frame.to) === null) return [];
  const text = `rest band ±${say(restBand, { dimension: "displacement", motion: scenario.motion })}`;
  // Over its word a band is highest at one end of it: where it falls, at the beginning.
  const spots = placesFor(text, frame).map((x) => {
    const ends = [x, x + wide(text)].map((place) => (equilibrium(timeAt(frame, place)) ?? 0) + restBand);
    const edge = yOf(panel, Math.max(...ends));
    return { x, y: edge - FALL > panel.top ? edge - RISE - 2 : edge + FALL };
  });
  const curves = [{ t: samples.t, values: samples.x }];
  // From a little way in on: the first places are those of what happens at the start.
  const spot = [...spots.slice(2), ...spots].find((each) => isFree(curves, frame, panel, each, text));
  return spot ? [{ key: "band", text, ...spot, anchor: "start", tone: "band-line" }] : [];
}

/** Below its line or above it, where both motions leave room. */
function overlayLabels(
  { samples }: RunView,
  frame: Frame,
  panel: PanelFrame,
  overlays: readonly Overlay[],
): PanelLabel[] {
  return overlays.flatMap((overlay): PanelLabel[] => {
    const text = shortened(overlay.label);
    const spots = placesFor(text, frame)
      .reverse()
      .flatMap((x) => {
        const there = overlayAt(overlay, timeAt(frame, x + wide(text) / 2));
        if (!there) return [];
        const y = yOf(panel, there.x);
        return [
          { x, y: y + FALL + 8 },
          { x, y: y - RISE - 8 },
        ];
      });
    const curves = [samples.x, overlay.samples.x].map((values, i) => ({
      t: i === 0 ? samples.t : overlay.samples.t,
      values,
    }));
    const spot = spots.find((each) => isFree(curves, frame, panel, each, text)) ?? spots[0];
    return spot ? [{ key: overlay.key, text, ...spot, anchor: "start", tone: "quiet" }] : [];
  });
}

/** A title may be of any length; beside the panel it stands in full. */
const LONGEST = 30;
const shortened = (title: string): string =>
  title.length > LONGEST ? `${title.slice(0, LONGEST - 1).trimEnd()}…` : title;

/** Above the dashed line, from the left on. */
function speedLabel(view: RunView, frame: Frame, panel: PanelFrame): PanelLabel[] {
  const { samples, scenario } = view;
  const text = scenario.base.length > 0 ? "feed" : "belt";
  return driveSpeed(view).map((speed) => {
    const y = yOf(panel, speed) - RISE;
    const places = placesFor(text, frame);
    const curves = [{ t: samples.t, values: samples.v }];
    const x = places.find((place) => isFree(curves, frame, panel, { x: place, y }, text)) ?? places[0];
    return { key: "speed", text, x, y, anchor: "start", tone: "quiet" };
  });
}

/** At the line that is in the picture: above it, or below it where it is at the panel's upper edge; left out where there is no room. */
function holdLabel({ inputs, scenario, samples }: RunView, frame: Frame, panel: PanelFrame): PanelLabel[] {
  const hold = inputs.hold(frame.from);
  const level = [hold, -hold].find((force) => force > panel.low && force < panel.high);
  if (hold === 0 || level === undefined || scenario.contact.normal.ripple) return [];
  const at = yOf(panel, level);
  const y = at - FALL > panel.top ? at - RISE : at + FALL;
  const text = `holds up to ${say(hold, { dimension: "force", motion: scenario.motion }, { digits: 4 })}`;
  const places = placesFor(text, frame).reverse();
  const curves = [{ t: samples.t, values: samples.f }];
  const x = places.find((place) => isFree(curves, frame, panel, { x: place, y }, text));
  return x === undefined ? [] : [{ key: "hold", text, x, y, anchor: "start", tone: "stick" }];
}

/** About how wide a word is, px. */
const wide = (text: string): number => 7 * text.length + 8;

/** Where a word may begin, from the left to the right end of the panels. */
const placesFor = (text: string, frame: Frame): number[] =>
  Array.from({ length: 11 }, (_, i) => frame.left + 4 + (i / 10) * Math.max(0, plotWidth(frame) - wide(text)));

interface Values {
  readonly t: Float64Array;
  readonly values: Float64Array;
}

/** True where no curve runs through a word that begins at x on y. */
function isFree(
  curves: readonly Values[],
  frame: Frame,
  panel: PanelFrame,
  { x, y }: { x: number; y: number },
  text: string,
): boolean {
  if (y - FALL < panel.top || y > panel.top + panel.height) return false;
  const [first, last] = [timeAt(frame, x), timeAt(frame, x + wide(text))];
  return curves.every(({ t, values }) => {
    let [low, high] = [Infinity, -Infinity];
    for (let i = indexAt(t, first); i < t.length && t[i] <= last; i++) {
      low = Math.min(low, values[i]);
      high = Math.max(high, values[i]);
      if (yOf(panel, high) <= y + RISE / 2 && yOf(panel, low) >= y - FALL) return false;
    }
    return true;
  });
}

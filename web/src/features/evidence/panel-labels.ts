import { say } from "../../format/format-quantity.ts";
import { plotWidth, timeAt, xOf, yOf, type Frame, type PanelFrame, type PanelKey } from "./frame.ts";
import { overlayAt, type Overlay } from "./overlay.ts";
import type { RunView } from "./run-view.ts";
import { driveSpeed, extremesOf } from "./scales.ts";

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
    ...(displacement ? overlayLabels(frame, displacement, overlays) : []),
    ...(velocity ? speedLabel(view, frame, velocity) : []),
    // Beside the panels it stands in the gutter.
    ...(friction && frame.right < 100 ? holdLabel(view, frame, friction) : []),
  ];
}

/** At a third of what is seen: above the band's upper edge, or within the band where that is at the panel's. */
function bandLabel({ inputs, scenario }: RunView, frame: Frame, panel: PanelFrame): PanelLabel[] {
  const t = frame.from + 0.3 * (frame.to - frame.from);
  const centre = inputs.equilibrium(t);
  if (inputs.restBand === null || centre === null || inputs.times(frame.from, frame.to) === null) return [];
  const edge = yOf(panel, centre + inputs.restBand);
  const width = say(inputs.restBand, { dimension: "displacement", motion: scenario.motion });
  const y = edge - FALL > panel.top ? edge - RISE - 4 : edge + FALL;
  if (y < panel.top || y > panel.top + panel.height) return [];
  // A band that falls leaves room to its right.
  const anchor = (inputs.equilibrium(frame.to) ?? 0) < centre ? "start" : "end";
  return [{ key: "band", text: `rest band ±${width}`, x: xOf(frame, t), y, anchor, tone: "band-line" }];
}

/** At four fifths of what is seen, or at its end. */
function overlayLabels(frame: Frame, panel: PanelFrame, overlays: readonly Overlay[]): PanelLabel[] {
  const wanted = frame.from + 0.8 * (frame.to - frame.from);
  return overlays.flatMap((overlay): PanelLabel[] => {
    const t = Math.min(wanted, overlay.samples.t[overlay.samples.t.length - 1]);
    const there = overlayAt(overlay, t);
    if (!there || t < frame.from) return [];
    const y = yOf(panel, there.x) + 12 + FALL;
    return [{ key: overlay.key, text: shortened(overlay.label), x: xOf(frame, t), y, anchor: "end", tone: "quiet" }];
  });
}

/** A title may be of any length; beside the panel it stands in full. */
const LONGEST = 30;
const shortened = (title: string): string =>
  title.length > LONGEST ? `${title.slice(0, LONGEST - 1).trimEnd()}…` : title;

/** About the width of a word like "feed", px. */
const WORD = 34;

/** Where the body's own curve leaves room above the line, from the left on; at the left where it nowhere does. */
function speedLabel(view: RunView, frame: Frame, panel: PanelFrame): PanelLabel[] {
  return driveSpeed(view).map((speed) => {
    const y = yOf(panel, speed) - RISE;
    const places = [0, 0.2, 0.4, 0.6, 0.8, 1].map((share) => frame.left + 4 + share * (plotWidth(frame) - WORD - 8));
    const x = places.find((place) => isFree(view, frame, panel, { x: place, y })) ?? places[0];
    return {
      key: "speed",
      text: view.scenario.base.length > 0 ? "feed" : "belt",
      x,
      y,
      anchor: "start",
      tone: "quiet",
    };
  });
}

/** True where the velocity keeps off a word that stands at x on y. */
function isFree({ samples }: RunView, frame: Frame, panel: PanelFrame, { x, y }: { x: number; y: number }): boolean {
  const [low, high] = extremesOf(samples, "v", { from: timeAt(frame, x), to: timeAt(frame, x + WORD) });
  return yOf(panel, high) > y + RISE / 2 || yOf(panel, low) < y - FALL;
}

/** At the line that is in the picture; above it, or below it where it is at the panel's upper edge. */
function holdLabel({ inputs, scenario }: RunView, frame: Frame, panel: PanelFrame): PanelLabel[] {
  const hold = inputs.hold(frame.from);
  const level = [hold, -hold].find((force) => force > panel.low && force < panel.high);
  if (hold === 0 || level === undefined || scenario.contact.normal.ripple) return [];
  const at = yOf(panel, level);
  const y = at - FALL > panel.top ? at - RISE : at + FALL;
  const force = say(hold, { dimension: "force", motion: scenario.motion }, { digits: 4 });
  return [
    {
      key: "hold",
      text: `holds up to ${force}`,
      x: frame.left + plotWidth(frame) - 4,
      y,
      anchor: "end",
      tone: "stick",
    },
  ];
}

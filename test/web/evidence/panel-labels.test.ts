import { describe, expect, it } from "vitest";
import { frameOf, timeAt, yOf } from "../../../web/src/features/evidence/frame.ts";
import { panelLabels } from "../../../web/src/features/evidence/panel-labels.ts";
import { runViewOf, type RunView } from "../../../web/src/features/evidence/run-view.ts";
import { scalesOf } from "../../../web/src/features/evidence/scales.ts";
import { coulombForces } from "../../support/scenario-builder.ts";
import { creepFeed, solved, variant } from "../support/scenarios.ts";

const viewOf = (run: ReturnType<typeof solved>): RunView => runViewOf(run.scenario, run.result) as RunView;
const feed = viewOf(solved(creepFeed));
const range = { from: 0, to: 0.5 };
const plain = (text: string): string => text.replace("\u00a0", " ");

describe("the words at the lines of the panels", () => {
  it("name the rest band and the feed; beside the panels the gutter tells the rest", () => {
    const frame = frameOf(1160, range, scalesOf(feed, range));
    const labels = panelLabels(feed, frame, []);
    expect(labels.map(({ text }) => plain(text))).toEqual(["rest band ±74.1 μm", "feed"]);
    const [displacement, velocity] = frame.panels;
    // The word stands above the band's upper edge, which is highest where the word ends.
    const end = timeAt(frame, labels[0].x + 7 * labels[0].text.length);
    const edge = yOf(displacement, 0.002 * end + (0.15 * (120 * 9.80665 + 800)) / 4e6);
    expect(labels[0].y).toBeLessThan(edge);
    expect(labels[0].y).toBeGreaterThan(displacement.top);
    expect(labels[1].y).toBeCloseTo(yOf(velocity, 0.002) - 6, 9);
  });

  it("stand where the body's own curve leaves room", () => {
    const words = (run: RunView) => panelLabels(run, frameOf(1160, range, scalesOf(run, range)), []);
    expect(words(feed)[1].x).toBe(80);
    // Back at 20 mm/s it swings about that speed at first and runs at it in the end.
    const back = variant({
      body: { inertia: 120, stiffness: 4e6, cubic: 0, viscous: 4100 },
      base: [{ kind: "ramp", rate: -0.02, start: 0, stop: "none" }],
    });
    const fast = viewOf(solved(back));
    expect(words(fast)[1].x).toBeGreaterThan(300);
  });

  it("name what friction can hold where there is no gutter", () => {
    const part = { from: 0.1535, to: 0.1775 };
    const frame = frameOf(390, part, scalesOf(feed, part));
    expect(panelLabels(feed, frame, []).map(({ text }) => plain(text))).toContain("holds up to 296.5 N");
  });

  it("name another motion at its line, shortened", () => {
    const faster = viewOf(solved(variant({ base: [{ kind: "ramp", rate: 0.003, start: 0, stop: "none" }] })));
    const overlays = [
      { key: "faster", label: "A feed that is half as fast again as the one before", samples: faster.samples },
    ];
    const frame = frameOf(1160, range, scalesOf(feed, range, [], overlays));
    const [, other] = panelLabels(feed, frame, overlays);
    expect(other.text).toBe("A feed that is half as fast a…");
  });

  it("leave the rest band out where the body swings through every place for it", () => {
    const swinging = viewOf(
      solved({
        body: { inertia: 1, stiffness: 1e4 },
        contact: coulombForces(1),
        force: [{ kind: "harmonic", amplitude: 10, hz: 10 }],
        span: { seconds: 10, untilRest: false },
      }),
    );
    const part = { from: 0, to: 10 };
    const labels = panelLabels(swinging, frameOf(1160, part, scalesOf(swinging, part)), []);
    expect(labels.map(({ key }) => key)).not.toContain("band");
  });

  it("say nothing of a band that is not there", () => {
    const free = viewOf(
      solved({
        body: { inertia: 1, stiffness: 0 },
        contact: coulombForces(1),
        initial: { velocity: 1 },
        span: { seconds: 5 },
      }),
    );
    const part = { from: 0, to: free.end };
    expect(panelLabels(free, frameOf(1160, part, scalesOf(free, part)), [])).toEqual([]);
  });
});

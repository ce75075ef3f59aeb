import { render, screen } from "@testing-library/react";
import { beforeEach, describe, expect, it } from "vitest";
import { MarginRuler } from "../../../web/src/components/margin-ruler.tsx";
import { MotionStrip } from "../../../web/src/components/motion-strip.tsx";
import { PowerText } from "../../../web/src/components/power-text.tsx";
import { stripShapes, type StripInterval } from "../../../web/src/components/strip-shapes.ts";
import { allowLayout } from "../support/missing-in-jsdom.ts";

beforeEach(allowLayout);

const frame = { from: 0, to: 10, width: 100, height: 20 };

describe("the motion strip", () => {
  it("puts slip forward above the line, slip back below it and stick across it", () => {
    const intervals: StripInterval[] = [
      { from: 0, to: 2, phase: 0 },
      { from: 2, to: 5, phase: 1 },
      { from: 5, to: 10, phase: -1 },
    ];
    expect(stripShapes(intervals, frame)).toEqual({
      stick: "M0 5h20v10h-20z",
      forward: "M20 0h30v10h-30z",
      back: "M50 10h50v10h-50z",
    });
  });

  it("shows what is seen of a stretch, and leaves out the rest", () => {
    const intervals: StripInterval[] = [
      { from: -5, to: 5, phase: 1 },
      { from: 20, to: 30, phase: 0 },
    ];
    expect(stripShapes(intervals, frame)).toEqual({ forward: "M0 0h50v10h-50z", stick: "", back: "" });
  });

  it("never lets a stretch vanish", () => {
    expect(stripShapes([{ from: 3, to: 3 + 1e-9, phase: 0 }], frame).stick).toBe("M30 5h0.75v10h-0.75z");
  });

  it("shows shares of time where stretches are too narrow to tell apart", () => {
    const intervals: StripInterval[] = Array.from({ length: 4000 }, (_, i) => ({
      from: i * 0.0025,
      to: (i + 1) * 0.0025,
      phase: i % 4 === 0 ? 0 : 1,
    }));
    const { forward, stick, back } = stripShapes(intervals, frame);
    // A quarter of each column stuck, three quarters sliding forward: 2.5 and 7.5 of half the height.
    expect(forward.match(/v[\d.]+/g)?.every((height) => height === "v7.5")).toBe(true);
    expect(stick.match(/v[\d.]+/g)?.every((height) => height === "v2.5")).toBe(true);
    expect(stick.match(/M/g)).toHaveLength(50);
    expect(back).toBe("");
  });

  it("is told in words", () => {
    render(<MotionStrip intervals={[]} from={0} to={1} label="Motion: stuck throughout." isNever />);
    expect(screen.getByRole("img", { name: "Motion: stuck throughout." })).toContainHTML("hatch-never");
  });
});

describe("the margin ruler", () => {
  const format = (value: number): string => `${value} mm`;

  it("has a notch with its figure at each bound, and a needle at the value", () => {
    const { container } = render(
      <MarginRuler min={-5} max={5} value={2} verdict="kept" from={-10} to={10} format={format} label="Rest offset" />,
    );
    expect(screen.getByText("-5 mm")).toBeInTheDocument();
    expect(screen.getByText("5 mm")).toBeInTheDocument();
    expect(screen.getByText("10 mm")).toBeInTheDocument();
    // 360 px wide: 1 + 12/20 of 358
    expect(container.querySelector("path.fill-kept")).toHaveAttribute("d", expect.stringMatching(/^M215\.8 /));
  });

  it("has no needle where there is no value, and keeps one beyond its scale at the end", () => {
    const { container, rerender } = render(
      <MarginRuler max={1} value={null} verdict="unknown" from={0} to={2} format={format} label="None" />,
    );
    expect(container.querySelector("path.fill-quiet")).toBeNull();
    rerender(<MarginRuler max={1} value={99} verdict="broken" from={0} to={2} format={format} label="Far" />);
    expect(container.querySelector("path.fill-broken")).toHaveAttribute("d", expect.stringMatching(/^M359 /));
  });
});

it("powers of ten are set small by the page", () => {
  const { container } = render(<PowerText text="9.2·10⁻¹³ mJ" />);
  expect(container.querySelector("sup")).toHaveTextContent("−13");
  expect(container).toHaveTextContent("9.2·10−13 mJ");
});

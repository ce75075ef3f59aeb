import { describe, expect, it } from "vitest";
import {
  between,
  following,
  isClosest,
  isWhole,
  panned,
  zoomed,
} from "../../../web/src/features/evidence/part-of-run.ts";

const part = { from: 2, to: 6 };

describe("the part of the run that is seen", () => {
  it("comes closer about an instant, which keeps its place", () => {
    expect(zoomed(part, 10, 3, 0.5)).toEqual({ from: 2.5, to: 4.5 });
    expect(zoomed(part, 10, 2, 0.25)).toEqual({ from: 2, to: 3 });
  });

  it("becomes no wider than the run and no closer than a hundred-thousandth of it", () => {
    expect(zoomed(part, 10, 3, 100)).toEqual({ from: 0, to: 10 });
    expect(isWhole(zoomed(part, 10, 3, 100), 10)).toBe(true);
    const closest = zoomed(part, 10, 3, 1e-9);
    expect(closest.to - closest.from).toBeCloseTo(1e-4, 12);
    expect(isClosest(closest, 10)).toBe(true);
    expect(isClosest(part, 10)).toBe(false);
  });

  it("moves along and stops at the ends, its width kept", () => {
    expect(panned(part, 10, 3)).toEqual({ from: 5, to: 9 });
    expect(panned(part, 10, 30)).toEqual({ from: 6, to: 10 });
    expect(panned(part, 10, -30)).toEqual({ from: 0, to: 4 });
  });

  it("lies between two instants in either order, within the run", () => {
    expect(between(2, 6, 10)).toEqual(part);
    expect(between(6, 2, 10)).toEqual(part);
    expect(between(-3, 14, 10)).toEqual({ from: 0, to: 10 });
    const closest = between(4, 4, 10);
    expect(closest.from).toBeCloseTo(4 - 5e-5, 12);
    expect(closest.to).toBeCloseTo(4 + 5e-5, 12);
  });

  it("follows the cursor only where that leaves it", () => {
    expect(following(part, 10, 5.9)).toBe(part);
    expect(following(part, 10, 7)).toEqual({ from: 5, to: 9 });
    expect(following(part, 10, 9.9)).toEqual({ from: 6, to: 10 });
  });
});

import { renderHook, waitFor } from "@testing-library/react";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { useHolding } from "../../../web/src/features/explore/threshold/use-holding.ts";
import { creepFeed, variant } from "../support/scenarios.ts";

const runs = vi.hoisted(() => ({ count: 0 }));
vi.mock("../../../web/src/compute/start-explore-worker.ts", async () => {
  const { startExploreWorker } = (await import("../support/exploration-page.ts")).exploreInOneThread();
  return {
    startExploreWorker: () => {
      const worker = startExploreWorker();
      return { ...worker, do: (...sent: Parameters<typeof worker.do>) => ((runs.count += 1), worker.do(...sent)) };
    },
  };
});

beforeEach(() => {
  localStorage.clear();
  runs.count = 0;
});
afterEach(() => vi.restoreAllMocks());

const held = async (scenario = creepFeed) => {
  const { result, unmount } = renderHook(() => useHolding(scenario));
  await waitFor(() => expect(result.current).not.toBeNull(), { timeout: 20_000 });
  unmount();
  return result.current ?? [];
};
const ours = () => Object.keys(localStorage).filter((key) => key.startsWith("restband-holding "));

describe("how far an answer holds", () => {
  it("is worked out once and kept: with another title it is the same, with another number it is not", async () => {
    const first = await held();
    const feed = first.find(({ path }) => path === "base[0].rate");
    expect(feed?.high.value).toBeCloseTo(0.008344, 5);
    expect(feed?.high.change).toEqual({ kind: "outcome" });
    const before = runs.count;
    expect(before).toBeGreaterThan(0);
    const again = await held({ ...creepFeed, title: "Another name" });
    expect(runs.count).toBe(before);
    expect(again.map(({ path, high }) => [path, high.value])).toEqual(
      first.map(({ path, high }) => [path, high.value]),
    );
    // that something changes is kept, the scenarios it was seen with are not
    expect(again.find(({ path }) => path === "base[0].rate")?.high.flip).toEqual({});
    const slower = await held(variant({ body: { ...creepFeed.body, viscous: 500 } }));
    expect(runs.count).toBeGreaterThan(before);
    expect(slower).not.toEqual(again);
  });

  it("keeps the newest sixty, and is worked out anew where storage is refused", async () => {
    for (let i = 0; i < 70; i++) localStorage.setItem(`restband-holding old ${i}`, "[]");
    await held();
    expect(ours()).toHaveLength(60);
    vi.spyOn(Storage.prototype, "setItem").mockImplementation(() => {
      throw new Error("full");
    });
    localStorage.clear();
    expect((await held()).length).toBeGreaterThan(0);
  });

  it("is not begun for a scenario that is gone within a moment", async () => {
    const { unmount } = renderHook(() => useHolding(creepFeed));
    unmount();
    await new Promise((resolve) => setTimeout(resolve, 1000));
    expect(runs.count).toBe(0);
  });
});

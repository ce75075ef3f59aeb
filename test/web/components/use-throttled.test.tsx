import { act, renderHook } from "@testing-library/react";
import { expect, it, vi } from "vitest";
import { useThrottled } from "../../../web/src/components/use-throttled.ts";

it("follows at its pace and ends at the newest", () => {
  vi.useFakeTimers();
  const { result, rerender } = renderHook(({ value }) => useThrottled(value, 200), { initialProps: { value: 0 } });
  act(() => void vi.advanceTimersByTime(500));
  const seen: number[] = [];
  for (let i = 1; i <= 50; i++) {
    rerender({ value: i });
    act(() => void vi.advanceTimersByTime(20));
    if (seen.at(-1) !== result.current) seen.push(result.current);
  }
  act(() => void vi.advanceTimersByTime(200));
  // 50 values in a second, shown about five times, the last of them in the end.
  expect(seen.length).toBeGreaterThanOrEqual(4);
  expect(seen.length).toBeLessThanOrEqual(7);
  expect(result.current).toBe(50);
  vi.useRealTimers();
});

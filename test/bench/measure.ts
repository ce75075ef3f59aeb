/** Processor seconds of this process, of all its threads. */
const processorTime = (): number => {
  const { user, system } = process.cpuUsage();
  return (user + system) / 1e6;
};

/** Processor seconds per call over at least `least` seconds of calls. */
export function timeOf(work: () => void, least = 0.08): number {
  let calls = 0;
  const start = processorTime();
  let spent = 0;
  while (spent < least) {
    work();
    calls++;
    spent = processorTime() - start;
  }
  return spent / calls;
}

export function median(values: readonly number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  const middle = sorted.length >> 1;
  return sorted.length % 2 === 1 ? sorted[middle] : (sorted[middle - 1] + sorted[middle]) / 2;
}

/** Bytes one call leaves behind or throws away, typed arrays included; needs node's --expose-gc. NaN without it. */
export function allocationOf(work: () => void): number {
  if (globalThis.gc === undefined) return NaN;
  const calls = 20;
  for (let i = 0; i < 10 * calls; i++) work(); // until the compiler has settled
  return Math.max(0, taken(work, calls) - taken(work, 0)) / calls;
}

/** Bytes so many calls take, and the reading of it with them: a median. */
function taken(work: () => void, calls: number): number {
  const readings = Array.from({ length: 7 }, () => {
    globalThis.gc?.();
    const before = process.memoryUsage();
    for (let i = 0; i < calls; i++) work();
    const after = process.memoryUsage();
    return after.heapUsed - before.heapUsed + after.arrayBuffers - before.arrayBuffers;
  });
  return median(readings);
}

/** Where a function that rises through 0 between two places does so, by halving to rounding. */
export function bisected(rising: (x: number) => number, from: number, to: number): number {
  let [low, high] = [from, to];
  for (;;) {
    const middle = (low + high) / 2;
    if (middle <= low || middle >= high) return high;
    if (rising(middle) < 0) low = middle;
    else high = middle;
  }
}

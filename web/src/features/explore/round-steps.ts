/** Values people read between two ends: steps of 1, 2 or 5, about seven of them. */
export function roundSteps(from: number, to: number, about = 7): number[] {
  const step = roundStep((to - from) / about);
  const values: number[] = [];
  for (let n = Math.ceil(from / step - 1e-9); n * step <= to + 1e-9 * step; n++)
    values.push(Number((n * step).toPrecision(12)));
  return values;
}

function roundStep(rough: number): number {
  const decade = 10 ** Math.floor(Math.log10(Math.abs(rough)));
  return decade * ([1, 2, 5, 10].find((digit) => digit * decade >= Math.abs(rough)) ?? 10);
}

import { bracketedRoot, dipAtEdge, lowest, type Dip } from "../../numerics/bracketed-root.ts";

const looks = 24;

/**
 * The instants in (a, b], in order, at which |g| passes `threshold` either way. Between two looks g may run right through
 * the band, or dip into it and out again: both are looked into.
 */
export function crossings(g: (t: number) => number, threshold: number, a: number, b: number): number[] {
  const found: number[] = [];
  const over = (t: number): number => Math.abs(g(t)) - threshold;
  const between = (from: number, to: number): void => {
    const [first, last] = [over(from), over(to)];
    if (first * last < 0) found.push(bracketedRoot(over, from, to, first, last));
  };
  const place = (n: number): number => (n === looks ? b : a + ((b - a) * n) / looks);
  for (let n = 1; n <= looks; n++) {
    const [last, now] = [place(n - 1), place(n)];
    const [gl, gn] = [g(last), g(now)];
    if (gl * gn < 0) {
      const zero = bracketedRoot(g, last, now, gl, gn);
      between(last, zero);
      between(zero, now);
    } else between(last, now);
    if (n > 1) found.push(...dip(over, place(n - 2), last, now));
    if (n === 1) found.push(...edgeDip(over, last, now));
    if (n === looks) found.push(...edgeDip(over, now, last));
  }
  return found.sort((x, y) => x - y);
}

/** A dip of |g| below the threshold and out again, between looks that are all above it. */
function dip(over: (t: number) => number, a: number, m: number, b: number): number[] {
  const [ga, gm, gb] = [over(a), over(m), over(b)];
  if (!(gm > 0 && gm <= ga && gm <= gb)) return [];
  return sidesOf(over, a, b, lowest(over, a, m, b, ga, gm, gb));
}

/** The same between an edge and the look next to it. */
function edgeDip(over: (t: number) => number, edge: number, inner: number): number[] {
  const [gEdge, gInner] = [over(edge), over(inner)];
  if (!(gEdge > 0 && gInner >= gEdge)) return [];
  const bottom = dipAtEdge(over, edge, inner, gEdge, gInner);
  return bottom === null ? [] : sidesOf(over, Math.min(edge, inner), Math.max(edge, inner), bottom);
}

function sidesOf(over: (t: number) => number, a: number, b: number, bottom: Dip): number[] {
  if (bottom.value >= 0) return [];
  return [
    bracketedRoot(over, a, bottom.x, over(a), bottom.value),
    bracketedRoot(over, bottom.x, b, bottom.value, over(b)),
  ];
}

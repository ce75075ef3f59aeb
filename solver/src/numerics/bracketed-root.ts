/**
 * A zero of a continuous g in [a, b], g(a) and g(b) of opposite signs (a zero counts as either): the Illinois variant of
 * false position (Dowell & Jarratt, BIT 11 (1971) 168), halving where it stalls; to the last digits of x.
 */
export function bracketedRoot(g: (x: number) => number, a: number, b: number, ga: number, gb: number): number {
  if (ga === 0) return a;
  for (let i = 0; i < 200; i++) {
    if (gb === 0 || Math.abs(b - a) <= 2 ** -51 * Math.max(Math.abs(a), Math.abs(b))) return b;
    let x = b - (gb * (b - a)) / (gb - ga);
    const isStalled = i % 8 === 7 || !(x > Math.min(a, b) && x < Math.max(a, b));
    if (isStalled) x = (a + b) / 2;
    if (x === a || x === b) return b;
    const gx = g(x);
    if (gx < 0 === gb < 0 && gx !== 0) ga /= 2;
    else {
      a = b;
      ga = gb;
    }
    b = x;
    gb = gx;
  }
  return b;
}

const looks = 16;

/**
 * The first falling zero in (a, b] of a smooth g that is positive just after a: a sign change between 16 looks, or a dip
 * next to them that a parabola reaches (two zeros within one look are found so). Infinity where there is none. What bends
 * more often than the looks would be missed: callers keep [a, b] within a radian or two.
 *
 * @param floor a look counts as fallen where g ≤ floor: 0, or less where g still rises out of its own error
 */
export function firstFall(g: (x: number) => number, a: number, b: number, floor = 0): number {
  let before = a;
  let gBefore = Infinity;
  let last = a;
  let gLast = g(a);
  for (let n = 1; n <= looks; n++) {
    const x = n === looks ? b : a + ((b - a) * n) / looks;
    const gx = g(x);
    if (gx <= floor) return gLast > 0 ? bracketedRoot(g, last, x, gLast, gx) : fallAfterStart(g, a, x, gx);
    if (floor === 0) {
      let bottom: Dip | null = null;
      if (n === 1 && gx >= gLast) bottom = dipAtEdge(g, a, x, gLast, gx);
      else if (gLast <= gBefore && gLast <= gx) bottom = lowest(g, before, last, x, gBefore, gLast, gx);
      else if (n === looks && gx < gLast) bottom = dipAtEdge(g, x, last, gx, gLast);
      if (bottom !== null && bottom.value <= 0) return bracketedRoot(g, before, bottom.x, g(before), bottom.value);
    }
    before = last;
    gBefore = gLast;
    last = x;
    gLast = gx;
  }
  return Infinity;
}

/** The fall of a g that no look has seen above 0: it has risen, if at all, right after a. The look itself where it never has. */
function fallAfterStart(g: (x: number) => number, a: number, x: number, gx: number): number {
  for (let share = 1 / 2; share > 2 ** -40; share /= 2) {
    const risen = a + share * (x - a);
    const value = g(risen);
    if (value > 0) return bracketedRoot(g, risen, x, value, gx);
  }
  return x;
}

/** Where g dips, and how far. */
export interface Dip {
  readonly x: number;
  readonly value: number;
}

/** The bottom between an edge and its neighbour, where g falls away from the edge before it rises; null where it does not. */
export function dipAtEdge(
  g: (x: number) => number,
  edge: number,
  inner: number,
  gEdge: number,
  gInner: number,
): Dip | null {
  for (const share of [1 / 8, 1 / 64, 1 / 512]) {
    const m = edge + share * (inner - edge);
    const gm = g(m);
    if (gm >= gEdge) continue;
    return edge < inner ? lowest(g, edge, m, inner, gEdge, gm, gInner) : lowest(g, inner, m, edge, gInner, gm, gEdge);
  }
  return null;
}

/** The bottom of a dip by three parabolas. */
export function lowest(
  g: (x: number) => number,
  a: number,
  m: number,
  b: number,
  ga: number,
  gm: number,
  gb: number,
): Dip {
  let [x0, x1, x2, g0, g1, g2] = [a, m, b, ga, gm, gb];
  for (let i = 0; i < 5 && g1 > 0; i++) {
    const r = (x1 - x0) * (g1 - g2);
    const q = (x1 - x2) * (g1 - g0);
    const x = x1 - (0.5 * ((x1 - x0) * r - (x1 - x2) * q)) / (r - q);
    if (!(x > x0 && x < x2) || x === x1) break;
    const gx = g(x);
    if (gx < g1) {
      if (x < x1) [x2, g2] = [x1, g1];
      else [x0, g0] = [x1, g1];
      [x1, g1] = [x, gx];
    } else if (x < x1) [x0, g0] = [x, gx];
    else [x2, g2] = [x, gx];
  }
  return { x: x1, value: g1 };
}

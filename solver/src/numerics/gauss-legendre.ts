/**
 * Ten-point Gauss–Legendre rule on [−1, 1]: exact for polynomials of degree 19, and for e^{iwx} with |w| ≤ 2 to below
 * rounding. Nodes and weights: Abramowitz & Stegun (1964), table 25.4, to double precision.
 */
const half = [
  [0.14887433898163122, 0.29552422471475287],
  [0.4333953941292472, 0.26926671930999635],
  [0.6794095682990244, 0.21908636251598204],
  [0.8650633666889845, 0.1494513491505806],
  [0.9739065285171717, 0.06667134430868814],
] as const;

export const gaussNodes: readonly number[] = [...half.map(([x]) => -x).reverse(), ...half.map(([x]) => x)];
export const gaussWeights: readonly number[] = [...half.map(([, w]) => w).reverse(), ...half.map(([, w]) => w)];

const groups = 20;
/** Student's t at 97.5 % with `groups` − 1 degrees of freedom. */
const t975 = 2.093024054408263;

/**
 * The first-order share of a variance, Var(E[y|x])/Var(y), from pairs: the values of y in equal classes of x by rank, the
 * classes' own scatter taken out (Pearson's correlation ratio with Kelley's correction of 1935, ε²); its 95 % interval by a
 * jackknife over 20 groups (Quenouille, Tukey), all kept within 0…1. Null where y does not vary.
 *
 * @param ranks of x, from 1 on (see `ranksOf`)
 *
 * Few wide classes cannot follow an x that makes y swing many times over its range: the share is then too small.
 */
export function varianceShare(
  ranks: ArrayLike<number>,
  y: ArrayLike<number>,
): { value: number; low: number; high: number } | null {
  const classes = Math.max(5, Math.min(50, Math.round(Math.sqrt(ranks.length) / 2)));
  const sums = groupSums(ranks, y, classes);
  const all = sums.reduce<Sums>(added, emptySums(classes));
  const value = shareOf(all);
  if (value === null) return null;
  const left = sums.map((one) => shareOf(all.map((sum, i) => sum - one[i])) ?? value);
  const pseudo = left.map((without) => groups * value - (groups - 1) * without);
  const mean = pseudo.reduce((sum, one) => sum + one, 0) / groups;
  const scatter = pseudo.reduce((sum, one) => sum + (one - mean) ** 2, 0) / (groups - 1);
  const half = t975 * Math.sqrt(scatter / groups);
  return { value: within(value), low: within(value - half), high: within(value + half) };
}

const within = (share: number): number => Math.min(1, Math.max(0, share));

/** Of each class: count, sum and sum of squares of y, one after another. */
type Sums = number[];

const emptySums = (classes: number): Sums => Array.from({ length: 3 * classes }, () => 0);
const added = (a: Sums, b: Sums): Sums => a.map((sum, i) => sum + b[i]);

/** Pairs are dealt out to the groups in turn. y is taken from its mean, so that its squares lose no digits. */
function groupSums(ranks: ArrayLike<number>, y: ArrayLike<number>, classes: number): Sums[] {
  const n = y.length;
  let mean = 0;
  for (let i = 0; i < n; i++) mean += y[i] / n;
  const sums = Array.from({ length: groups }, () => emptySums(classes));
  for (let i = 0; i < n; i++) {
    const at = 3 * Math.min(classes - 1, Math.floor(((ranks[i] - 0.5) / n) * classes));
    const [own, value] = [sums[i % groups], y[i] - mean];
    own[at] += 1;
    own[at + 1] += value;
    own[at + 2] += value * value;
  }
  return sums;
}

/** ε² = 1 − (n − 1)/(n − k) · SS_within/SS_total. */
function shareOf(sums: Sums): number | null {
  let [n, sum, squares, between, classes] = [0, 0, 0, 0, 0];
  for (let at = 0; at < sums.length; at += 3) {
    if (sums[at] === 0) continue;
    n += sums[at];
    sum += sums[at + 1];
    squares += sums[at + 2];
    between += sums[at + 1] ** 2 / sums[at];
    classes++;
  }
  const total = squares - (sum * sum) / n;
  if (!(total > 1e-24 * squares)) return null;
  return 1 - (((n - 1) / (n - classes)) * (squares - between)) / total;
}

/** Ranks from 1 on, equal values sharing the mean of theirs. */
export function ranksOf(values: ArrayLike<number>): Float64Array {
  const order = Uint32Array.from({ length: values.length }, (_, i) => i).sort((a, b) => values[a] - values[b]);
  const ranks = new Float64Array(values.length);
  for (let from = 0; from < order.length;) {
    let to = from + 1;
    while (to < order.length && values[order[to]] === values[order[from]]) to++;
    for (let i = from; i < to; i++) ranks[order[i]] = (from + to + 1) / 2;
    from = to;
  }
  return ranks;
}

/** Pearson's correlation of two columns of equal length; null where one of them does not vary. */
export function correlationOf(a: ArrayLike<number>, b: ArrayLike<number>): number | null {
  const [meanA, meanB] = [meanOf(a), meanOf(b)];
  let [ab, aa, bb] = [0, 0, 0];
  for (let i = 0; i < a.length; i++) {
    const [x, y] = [a[i] - meanA, b[i] - meanB];
    ab += x * y;
    aa += x * x;
    bb += y * y;
  }
  return aa === 0 || bb === 0 ? null : ab / Math.sqrt(aa * bb);
}

/** Spearman's rank correlation (1904); null where one of the columns does not vary. */
export const rankCorrelation = (a: ArrayLike<number>, b: ArrayLike<number>): number | null =>
  correlationOf(ranksOf(a), ranksOf(b));

export function meanOf(values: ArrayLike<number>): number {
  let sum = 0;
  for (let i = 0; i < values.length; i++) sum += values[i];
  return sum / values.length;
}

/** The standard deviation of a sample, by n − 1; 0 of a single value. */
export function deviationOf(values: ArrayLike<number>): number {
  const mean = meanOf(values);
  let sum = 0;
  for (let i = 0; i < values.length; i++) sum += (values[i] - mean) ** 2;
  return values.length < 2 ? 0 : Math.sqrt(sum / (values.length - 1));
}

/** The value below which a share of sorted values lies, straight between neighbours: place (n − 1) × share (Hyndman & Fan's type 7). */
export function percentileOf(sorted: ArrayLike<number>, share: number): number {
  const place = (sorted.length - 1) * share;
  const below = Math.floor(place);
  const above = Math.min(sorted.length - 1, below + 1);
  return sorted[below] + (place - below) * (sorted[above] - sorted[below]);
}

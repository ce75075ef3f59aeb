const degree = 15;
const nodes = degree + 1;
/** Chebyshev–Lobatto points on [0, 1], and the weights of their barycentric formula. */
const places = Float64Array.from({ length: nodes }, (_, j) => (1 - Math.cos((Math.PI * j) / degree)) / 2);
const weights = Float64Array.from(places, (_, j) => (j % 2 === 0 ? 1 : -1) * (j === 0 || j === degree ? 0.5 : 1));

/**
 * The dense output of a run's steps, kept as polynomials through Chebyshev points: any instant can be asked again after
 * the integrator is gone. Evaluated by the barycentric formula (Berrut & Trefethen, SIAM Review 46 (2004) 501).
 */
export class StepStore {
  count = 0;
  private starts = new Float64Array(64);
  private ends = new Float64Array(64);
  private values: Float64Array<ArrayBuffer>;
  private readonly share = new Float64Array(nodes);

  constructor(private readonly unknowns: number) {
    this.values = new Float64Array(64 * unknowns * nodes);
  }

  push(from: number, to: number, dense: (i: number, t: number) => number): void {
    if (this.count === this.starts.length) this.grow();
    const step = this.count++;
    this.starts[step] = from;
    this.ends[step] = to;
    for (let i = 0; i < this.unknowns; i++) {
      for (let j = 0; j < nodes; j++) {
        this.values[(step * this.unknowns + i) * nodes + j] = dense(i, from + (to - from) * places[j]);
      }
    }
  }

  from(step: number): number {
    return this.starts[step];
  }

  to(step: number): number {
    return this.ends[step];
  }

  /** The step that holds t among steps first … last (contiguous in time); the nearest where none does. */
  find(t: number, first: number, last: number): number {
    let low = first;
    let high = last;
    while (low < high) {
      const middle = (low + high + 1) >> 1;
      if (this.starts[middle] <= t) low = middle;
      else high = middle - 1;
    }
    return low;
  }

  /** Fills `out` with all unknowns at t, a time of the step. */
  evaluate(step: number, t: number, out: Float64Array): void {
    const { share, unknowns } = this;
    const x = (t - this.starts[step]) / (this.ends[step] - this.starts[step]);
    let sum = 0;
    let exact = -1;
    for (let j = 0; j < nodes; j++) {
      const distance = x - places[j];
      if (distance === 0) exact = j;
      share[j] = weights[j] / distance;
      sum += share[j];
    }
    for (let i = 0; i < unknowns; i++) {
      const base = (step * unknowns + i) * nodes;
      if (exact >= 0) {
        out[i] = this.values[base + exact];
        continue;
      }
      let total = 0;
      for (let j = 0; j < nodes; j++) total += share[j] * this.values[base + j];
      out[i] = total / sum;
    }
  }

  private grow(): void {
    const grown = (old: Float64Array<ArrayBuffer>): Float64Array<ArrayBuffer> => {
      const larger = new Float64Array(2 * old.length);
      larger.set(old);
      return larger;
    };
    this.starts = grown(this.starts);
    this.ends = grown(this.ends);
    this.values = grown(this.values);
  }
}

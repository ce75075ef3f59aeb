import type { Phase } from "../../result.ts";

/** Where a body stands at the start of a segment, and by which closed form it goes on from there. */
export interface Stance {
  t: number;
  /** d. */
  position: number;
  /** ḋ. */
  velocity: number;
  /** d̈ where it is known exactly (break-away), else NaN. */
  acceleration: number;
  contact: Phase;
  /** Sign of ḋ, 0 where the spring's own set-valued element holds ḋ = 0; 1 without displacement-proportional damping. */
  spring: Phase;
  /** Sign of d; 1 without displacement-proportional damping. */
  side: Phase;
}

/** The segments of a run in flat arrays that grow by doubling. */
export class Segments {
  count = 0;
  private t = new Float64Array(64);
  private position = new Float64Array(64);
  private velocity = new Float64Array(64);
  private acceleration = new Float64Array(64);
  private contact = new Int8Array(64);
  private spring = new Int8Array(64);
  private side = new Int8Array(64);

  push(s: Stance): void {
    if (this.count === this.t.length) this.grow();
    const i = this.count++;
    this.t[i] = s.t;
    this.position[i] = s.position;
    this.velocity[i] = s.velocity;
    this.acceleration[i] = s.acceleration;
    this.contact[i] = s.contact;
    this.spring[i] = s.spring;
    this.side[i] = s.side;
  }

  load(i: number, into: Stance): void {
    into.t = this.t[i];
    into.position = this.position[i];
    into.velocity = this.velocity[i];
    into.acceleration = this.acceleration[i];
    into.contact = this.contact[i] as Phase;
    into.spring = this.spring[i] as Phase;
    into.side = this.side[i] as Phase;
  }

  from(i: number): number {
    return this.t[i];
  }

  phase(i: number): Phase {
    return this.contact[i] as Phase;
  }

  /** The last segment with from ≤ t. */
  find(t: number): number {
    let low = 0;
    let high = this.count - 1;
    while (low < high) {
      const middle = (low + high + 1) >> 1;
      if (this.t[middle] <= t) low = middle;
      else high = middle - 1;
    }
    return low;
  }

  private grow(): void {
    const size = 2 * this.t.length;
    this.t = grown(this.t, new Float64Array(size));
    this.position = grown(this.position, new Float64Array(size));
    this.velocity = grown(this.velocity, new Float64Array(size));
    this.acceleration = grown(this.acceleration, new Float64Array(size));
    this.contact = grown(this.contact, new Int8Array(size));
    this.spring = grown(this.spring, new Int8Array(size));
    this.side = grown(this.side, new Int8Array(size));
  }
}

function grown<A extends Float64Array | Int8Array>(old: A, larger: A): A {
  larger.set(old);
  return larger;
}

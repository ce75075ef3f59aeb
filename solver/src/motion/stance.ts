import type { Phase } from "../result.ts";

/** Where a body stands at the start of a segment, and by which closed form it goes on from there. */
export interface Stance {
  t: number;
  /** x; carried on unchanged while stuck to ground, so that a body at rest stays where it is to the last digit. */
  place: number;
  /** d. */
  position: number;
  /** ḋ. */
  velocity: number;
  /** v_r: exactly 0 where a slip starts from rest on the counterface. */
  slip: number;
  /** v̇_r where it is known better than the equation tells it (break-away), else NaN. */
  acceleration: number;
  contact: Phase;
  /** Sign of ḋ, 0 where the spring's own set-valued element holds ḋ = 0; 1 without displacement-proportional damping. */
  spring: Phase;
  /** Sign of d; 1 without displacement-proportional damping. */
  side: Phase;
}

/** A stance at t = 0 with everything still to be judged. */
export function newStance(): Stance {
  return { t: 0, place: 0, position: 0, velocity: 0, slip: 0, acceleration: NaN, contact: 0, spring: 1, side: 1 };
}

/** Member by member: Object.assign costs more than a slip's first look. */
export function copyStance(from: Stance, into: Stance): void {
  into.t = from.t;
  into.place = from.place;
  into.position = from.position;
  into.velocity = from.velocity;
  into.slip = from.slip;
  into.acceleration = from.acceleration;
  into.contact = from.contact;
  into.spring = from.spring;
  into.side = from.side;
}

/** The segments of a run in flat arrays that grow by doubling. */
export class Segments {
  count = 0;
  private t = new Float64Array(64);
  private place = new Float64Array(64);
  private position = new Float64Array(64);
  private velocity = new Float64Array(64);
  private slip = new Float64Array(64);
  private acceleration = new Float64Array(64);
  private contact = new Int8Array(64);
  private spring = new Int8Array(64);
  private side = new Int8Array(64);

  push(s: Stance): void {
    if (this.count === this.t.length) this.grow();
    const i = this.count++;
    this.t[i] = s.t;
    this.place[i] = s.place;
    this.position[i] = s.position;
    this.velocity[i] = s.velocity;
    this.slip[i] = s.slip;
    this.acceleration[i] = s.acceleration;
    this.contact[i] = s.contact;
    this.spring[i] = s.spring;
    this.side[i] = s.side;
  }

  load(i: number, into: Stance): void {
    into.t = this.t[i];
    into.place = this.place[i];
    into.position = this.position[i];
    into.velocity = this.velocity[i];
    into.slip = this.slip[i];
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
    this.place = grown(this.place, new Float64Array(size));
    this.position = grown(this.position, new Float64Array(size));
    this.velocity = grown(this.velocity, new Float64Array(size));
    this.slip = grown(this.slip, new Float64Array(size));
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

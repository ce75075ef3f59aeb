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

/** What may stand at the start of a segment; null where only the segment changes. */
const happenings = [null, "stop", "turn", "break-away"] as const;
export type Happening = (typeof happenings)[number];

/** Numbers a segment: its stance's six, and one for its signs and its happening. */
const width = 7;
const signs = 27;

/** A buffer given back, for the next run to take: what a sweep's thousands of runs would else allocate each. */
let spare: Float64Array | null = null;
/** Numbers a spare buffer holds at most (8 MB): one very long run is not worth keeping the room for. */
const mostSpare = 2 ** 20;

/** The segments of a run, and what happened at the start of each, in one flat array that grows by doubling. */
export class Segments {
  count = 0;
  /** How many starts have a happening. */
  happened = 0;
  private numbers: Float64Array;

  constructor() {
    this.numbers = spare ?? new Float64Array(64 * width);
    spare = null;
  }

  /** Gives the buffer to the next run; nothing can be asked after that. */
  release(): void {
    const { length } = this.numbers;
    if (length <= mostSpare && (spare === null || spare.length < length)) spare = this.numbers;
    this.numbers = new Float64Array(0);
    this.count = 0;
  }

  push(s: Stance, happening: Happening): void {
    const at = this.count++ * width;
    if (at === this.numbers.length) this.grow();
    const { numbers } = this;
    numbers[at] = s.t;
    numbers[at + 1] = s.place;
    numbers[at + 2] = s.position;
    numbers[at + 3] = s.velocity;
    numbers[at + 4] = s.slip;
    numbers[at + 5] = s.acceleration;
    let code = s.contact + 1 + 3 * (s.spring + 1) + 9 * (s.side + 1);
    if (happening !== null) {
      this.happened++;
      code += signs * (happening === "stop" ? 1 : happening === "turn" ? 2 : 3);
    }
    numbers[at + 6] = code;
  }

  load(i: number, into: Stance): void {
    const { numbers } = this;
    const at = i * width;
    into.t = numbers[at];
    into.place = numbers[at + 1];
    into.position = numbers[at + 2];
    into.velocity = numbers[at + 3];
    into.slip = numbers[at + 4];
    into.acceleration = numbers[at + 5];
    const code = numbers[at + 6] % signs;
    into.contact = ((code % 3) - 1) as Phase;
    into.spring = ((Math.floor(code / 3) % 3) - 1) as Phase;
    into.side = (Math.floor(code / 9) - 1) as Phase;
  }

  from(i: number): number {
    return this.numbers[i * width];
  }

  phase(i: number): Phase {
    return ((this.numbers[i * width + 6] % 3) - 1) as Phase;
  }

  happening(i: number): Happening {
    return happenings[Math.floor(this.numbers[i * width + 6] / signs)];
  }

  /** The last segment with from ≤ t. */
  find(t: number): number {
    let low = 0;
    let high = this.count - 1;
    while (low < high) {
      const middle = (low + high + 1) >> 1;
      if (this.from(middle) <= t) low = middle;
      else high = middle - 1;
    }
    return low;
  }

  private grow(): void {
    const larger = new Float64Array(2 * this.numbers.length);
    larger.set(this.numbers);
    this.numbers = larger;
  }
}

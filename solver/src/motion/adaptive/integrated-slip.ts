import { bracketedRoot, firstFall } from "../../numerics/bracketed-root.ts";
import type { Work } from "../../numerics/first-zero.ts";
import { widestPanel } from "../../numerics/panel-rule.ts";
import type { Problem } from "../../scenario/problem.ts";
import type { Inputs } from "../inputs.ts";
import { slidingFriction } from "../sliding-friction.ts";
import type { BodyValues, Cause, Ending, Slip, SlipWatches } from "../slip.ts";
import { copyStance, newStance, type Stance } from "../stance.ts";
import { integrate, usualTolerance } from "./integrate.ts";
import { StepStore } from "./step-store.ts";

/** A v_r below so many tolerances of its typical size is the integrator's own error: a slip must first rise out of it. */
const noiseTolerances = 100;
/** No step turns by more than this, rad: events are looked for within steps. */
const longestTurn = 1;

/**
 * A slip by integration: friction that varies with speed, a spring that stiffens, a sweep. The sign of v_r is kept while a
 * step goes on, so that the right-hand side can be asked past the event; the step's dense output is then searched for the
 * first zero. That step is taken again to end there, since a law may bend where v_r turns, which a step across it would
 * smear; and the run goes on from there. Steps are kept, so that the slip can be read again.
 */
export class IntegratedSlip implements Slip {
  position = 0;
  velocity = 0;
  acceleration = 0;
  slip = 0;

  private readonly store = new StepStore(2);
  /** Where each slip followed so far starts: its time, and its first step. */
  private readonly starts: number[] = [];
  private readonly firstSteps: number[] = [];
  private readonly stance = newStance();
  private body: BodyValues = { inertia: 1, stiffness: 0, viscous: 0, cubic: 0 };
  private first = 0;
  private last = -1;
  /** What v_r must rise above before its fall counts, m/s; and whether it has. */
  private noise = 0;
  private hasRisen = true;
  /** The largest |v_r| so far, m/s. */
  private fastest = 0;
  private readonly at = new Float64Array(2);
  private readonly noiseShare: number;
  /** What passed 0 at the end of the slip in hand. */
  private watched: ((t: number) => number) | null = null;

  constructor(
    private readonly problem: Problem,
    private readonly inputs: Inputs,
    private readonly tolerance = usualTolerance,
  ) {
    this.noiseShare = noiseTolerances * tolerance;
  }

  begin(_: Inputs, body: BodyValues, stance: Stance): void {
    copyStance(stance, this.stance);
    this.body = { ...body };
    const i = this.lastStartedAt(stance.t);
    this.first = 0;
    this.last = -1; // not followed yet: told by its start alone
    if (i < 0) return;
    this.first = this.firstSteps[i];
    this.last = (this.firstSteps[i + 1] ?? this.store.count) - 1;
  }

  follow(ending: Ending, watches: SlipWatches, _: number, work: Work): void {
    const { stance, store } = this;
    const limit = stance.t + ending.tau;
    this.starts.push(stance.t);
    this.firstSteps.push(store.count);
    this.first = store.count;
    this.last = this.first - 1;
    const rate = this.rate();
    this.fastest = this.sizes(rate)[1];
    this.noise = this.noiseShare * this.fastest;
    this.hasRisen = Math.abs(stance.slip) > this.noise;
    this.watched = null;
    const look = (from: number, to: number): boolean => {
      this.endsWithin(from, to, ending, watches);
      return ending.cause === "corner";
    };
    let from = stance.t;
    let state = [stance.position, stance.velocity];
    for (const to of this.stretches(limit, 1 / rate)) {
      const reached = this.integrate(from, to, state, work, look);
      if (ending.cause !== "corner") return this.retake(ending, work);
      if (reached < to) return void (work.spent = Infinity);
      this.evaluate(to - stance.t);
      from = to;
      state = [this.position, this.velocity];
    }
    if (this.stopsAt(ending.tau, 1e-9 / rate)) ending.cause = "contact";
  }

  /**
   * Where integration starts anew on the way to `limit`. Friction that drops with infinite slope at rest has no error
   * estimate there: a slip from rest then goes by stretches that grow tenfold, over each of which it is smooth.
   */
  private stretches(limit: number, unit: number): number[] {
    const { t, slip } = this.stance;
    if (!this.problem.law.isSteepAtRest || slip !== 0) return [limit];
    const ends = Array.from({ length: 8 }, (_, i) => t + unit * 10 ** (i - 9));
    return [...ends.filter((end) => end > t && end < limit), limit];
  }

  /** Steps on from a state at `from`; each is stored, then told to `onStep`, which says whether to go on. */
  private integrate(
    from: number,
    to: number,
    start: number[],
    work: Work,
    onStep: (from: number, to: number) => boolean,
  ): number {
    const { stance, store } = this;
    const rate = this.rate();
    return integrate({
      from,
      to,
      start,
      rates: (t, [position, velocity], out) => {
        out[0] = velocity;
        out[1] = this.accelerationAt(t - stance.t, position, velocity);
      },
      sizes: this.sizes(rate),
      unit: 1 / rate,
      longest: longestTurn / rate,
      tolerance: this.tolerance,
      work,
      onStep: (a, b, dense) => {
        store.push(a, b, dense);
        this.last = store.count - 1;
        return onStep(a, b);
      },
    });
  }

  /**
   * Takes the last step again, to end at what was found within it, and tells its time by the new one; again where that moves it
   * by more than a straight line can tell.
   */
  private retake(ending: Ending, work: Work): void {
    const { stance, store } = this;
    const from = store.from(this.last);
    const fallsAt = this.watched;
    // right after its start a step needs no second one
    const isLate = stance.t + ending.tau - from > 1e-6 * (store.to(this.last) - from);
    if (fallsAt === null || ending.isTouch || !isLate) return;
    store.evaluate(this.last, from, this.at);
    const start = [...this.at];
    const before = this.last - 1;
    for (let tries = 0; tries < 4; tries++) {
      const to = stance.t + ending.tau;
      this.last = before;
      store.count = before + 1;
      const reached = this.integrate(from, to, start, work, () => true);
      if (reached < to) return void (work.spent = Infinity);
      const apart = 1e-3 * (to - from);
      const value = fallsAt(to);
      const slope = (value - fallsAt(to - apart)) / apart;
      const later = -value / slope;
      if (!(Math.abs(later) < (to - from) / 2)) return;
      ending.tau += later;
      if (Math.abs(later) <= apart) return;
    }
  }

  /** True where v_r reaches 0 at τ to within `blur` s. */
  private stopsAt(tau: number, blur: number): boolean {
    const rate = this.slipRate(tau);
    return this.hasRisen && rate < 0 && this.stance.contact * this.slip <= -rate * blur;
  }

  evaluate(tau: number): void {
    const { store, inputs, problem } = this;
    const t = this.stance.t + tau;
    if (this.last < this.first) this.at.set([this.stance.position, this.stance.velocity]);
    else store.evaluate(store.find(t, this.first, this.last), t, this.at);
    [this.position, this.velocity] = this.at;
    this.acceleration = this.accelerationAt(tau, this.position, this.velocity);
    const base = inputs.values.baseVelocity;
    this.slip = problem.counterface === "base" ? this.velocity : this.velocity + base - problem.beltVelocity;
  }

  read(tau: number): void {
    this.evaluate(tau);
  }

  panel(tau: number): number {
    const { store } = this;
    const t = this.stance.t + tau;
    if (this.last < this.first) return Infinity;
    const step = store.find(t, this.first, this.last);
    return step === this.last ? Infinity : (store.to(step) - t) / widestPanel;
  }

  isSteady(): boolean {
    return false;
  }

  /** The last slip followed from t on, −1 without one. */
  private lastStartedAt(t: number): number {
    let low = -1;
    let high = this.starts.length - 1;
    while (low < high) {
      const middle = (low + high + 1) >> 1;
      if (this.starts[middle] <= t) low = middle;
      else high = middle - 1;
    }
    return low >= 0 && this.starts[low] === t ? low : -1;
  }

  /** d̈ with the sign of v_r kept. */
  private accelerationAt(tau: number, position: number, velocity: number): number {
    const { body, problem, stance } = this;
    const v = this.inputs.evaluate(tau);
    const relative = problem.counterface === "base" ? velocity : velocity + v.baseVelocity - problem.beltVelocity;
    const speed = Math.max(0, stance.contact * relative);
    const friction = stance.contact * slidingFriction(problem, speed, v.normal);
    const spring = body.stiffness * position + body.cubic * position ** 3;
    return (v.force - body.viscous * velocity - spring - friction) / body.inertia - v.baseAcceleration;
  }

  /** Looks for the first thing that ends the slip within a step. */
  private endsWithin(from: number, to: number, ending: Ending, watches: SlipWatches): void {
    const { stance, problem } = this;
    const channel = (pick: () => number, sign: number) => (t: number) => {
      this.evaluate(t - stance.t);
      return sign * pick();
    };
    const look = (g: (t: number) => number, cause: Cause, floor = 0): void => {
      const t = firstFall(g, from, Math.min(to, stance.t + ending.tau), floor);
      if (t === Infinity) return;
      ending.tau = t - stance.t;
      ending.cause = cause;
      this.watched = g;
    };
    look(
      channel(() => this.slip, stance.contact),
      "contact",
      this.hasRisen ? 0 : -this.noise,
    );
    if (this.hasRisen && ending.cause === "contact") this.markTouch(ending, to - stance.t);
    this.evaluate(to - stance.t);
    this.hasRisen ||= stance.contact * this.slip > this.noise;
    this.fastest = Math.max(this.fastest, Math.abs(this.slip));
    if (watches.side)
      look(
        channel(() => this.position, stance.side),
        "side",
      );
    if (watches.element)
      look(
        channel(() => this.velocity, stance.spring),
        "element",
      );
    for (const corner of problem.law.corners) {
      this.lookForCorner(
        channel(() => problem.radius * Math.abs(this.slip) - corner, 1),
        from,
        to,
        ending,
      );
    }
  }

  /**
   * A v_r that dips below 0 by no more than the integrator's error only touches it: told at the bottom, −v̇_r/v̈_r further on.
   * One that the error keeps above 0 is not seen: what a tolerance hides it must not invent either.
   */
  private markTouch(ending: Ending, end: number): void {
    const apart = 1e-4 / this.rate();
    const rate = this.slipRate(ending.tau);
    const second = (rate - this.slipRate(ending.tau - apart)) / apart;
    if (!(second > 0 && (rate * rate) / (2 * second) <= this.noiseShare * this.fastest)) return;
    ending.isTouch = true;
    ending.tau = Math.min(end, ending.tau - rate / second);
  }

  /** d|v_r|/dt at τ, m/s². */
  private slipRate(tau: number): number {
    this.evaluate(tau);
    const carrier = this.problem.counterface === "base" ? 0 : this.inputs.values.baseAcceleration;
    return this.stance.contact * (this.acceleration + carrier);
  }

  /** A corner of the law is passed either way; a slip that starts on one has left it by the end of the step. */
  private lookForCorner(g: (t: number) => number, from: number, to: number, ending: Ending): void {
    const looks = 8;
    const end = Math.min(to, this.stance.t + ending.tau);
    let last = from + (end - from) * 1e-6;
    let gLast = g(last);
    for (let n = 1; n <= looks; n++) {
      const t = from + ((end - from) * n) / looks;
      const gt = g(t);
      if (gLast * gt < 0) {
        ending.tau = bracketedRoot(g, last, t, gLast, gt) - this.stance.t;
        ending.cause = "law";
        this.watched = g;
        return;
      }
      last = t;
      gLast = gt;
    }
  }

  /** The fastest rate of the body and its inputs, 1/s. */
  private rate(): number {
    const { body, problem, stance } = this;
    const stiffness = body.stiffness + 3 * Math.abs(body.cubic) * stance.position ** 2;
    const own = Math.max(Math.sqrt(stiffness / body.inertia), body.viscous / body.inertia, this.inputs.fastest());
    return own > 0 ? own : 4 / problem.seconds;
  }

  /** Typical d and ḋ, m and m/s. Neither a place without a spring nor a counterface that runs by tells how far things go. */
  private sizes(rate: number): number[] {
    const { stance, body, problem } = this;
    const v = this.inputs.evaluate(0);
    const force = Math.abs(v.force) + problem.law.atRest * problem.radius * v.normal;
    const push = force / body.inertia + Math.abs(v.baseAcceleration);
    const stretch = body.stiffness > 0 || body.cubic !== 0 ? Math.abs(stance.position) : 0;
    const swing = Math.max(stretch, this.inputs.baseBound(0));
    const speed = Math.max(Math.abs(stance.velocity), push / Math.max(rate, this.lawRate(v.normal)), swing * rate);
    if (speed > 0) return [Math.max(swing, speed / rate), speed];
    const place = Math.abs(stance.position) || 1; // nothing moves it
    return [place, place * rate];
  }

  /** The rate at which friction that rises with speed slows the body down, 1/s; 0 where it does not rise. */
  private lawRate(normal: number): number {
    const { law, radius, inertia } = this.problem;
    const slope = law.slope(radius * Math.abs(this.stance.slip)) * normal;
    return slope > 0 && Number.isFinite(slope) ? (radius ** 2 * slope) / inertia : 0;
  }
}

import type { Inputs } from "./inputs.ts";

/** What a body is held against: fixed ground, a belt at constant velocity, or the moving base. */
export type Carrier = "ground" | "belt" | "base";

/**
 * A body carried along: ḋ = u̇ − ẏ is given, and what is asked is the force that it takes and whether that can be had.
 *
 *   need = m ü − F − W + C ḋ + K d + k3 d³ + slide·N(t),   room = grip·N(t) + constant.
 *
 * In a stick the carrier is the counterface, slide = 0 and grip = μs r; between the two set-valued elements of
 * displacement-proportional damping (ḋ = 0 while the contact slips) the carrier is the base, slide = s r μk is the
 * friction that acts, and constant = ρ k |d|.
 */
export class Carried {
  need = 0;
  needRate = 0;
  needSecond = 0;
  room = 0;
  roomRate = 0;
  roomSecond = 0;
  /** d and ḋ at the last `evaluate`. */
  position = 0;
  velocity = 0;
  /** u̇ of the carrier there, and ü. */
  carrierVelocity = 0;
  carrierAcceleration = 0;

  private inputs!: Inputs;
  private carrier: Carrier = "ground";
  private inertia = 0;
  private stiffness = 0;
  private viscous = 0;
  private cubic = 0;
  private slide = 0;
  private grip = 0;
  /** The part of room that the contact does not give: ρ k |d|. */
  constant = 0;
  private start = 0;
  private beltVelocity = 0;
  private startBase = 0;
  /** The τ last asked: asking again costs nothing. */
  private at = NaN;

  begin(
    inputs: Inputs,
    carrier: Carrier,
    beltVelocity: number,
    body: { inertia: number; stiffness: number; viscous: number; cubic: number },
    friction: { slide: number; grip: number; constant: number },
    position: number,
  ): void {
    this.inputs = inputs;
    this.carrier = carrier;
    this.beltVelocity = carrier === "belt" ? beltVelocity : 0;
    this.inertia = body.inertia;
    this.stiffness = body.stiffness;
    this.viscous = body.viscous;
    this.cubic = body.cubic;
    this.slide = friction.slide;
    this.grip = friction.grip;
    this.constant = friction.constant;
    this.start = position;
    this.startBase = inputs.evaluate(0).base;
    this.at = NaN;
  }

  evaluate(tau: number): void {
    const v = this.inputs.evaluate(tau); // first: what reads the inputs after this finds them at τ
    if (tau === this.at) return;
    this.at = tau;
    const isOnBase = this.carrier === "base";
    this.carrierVelocity = isOnBase ? v.baseVelocity : this.beltVelocity;
    this.carrierAcceleration = isOnBase ? v.baseAcceleration : 0;
    this.velocity = isOnBase ? 0 : this.beltVelocity - v.baseVelocity;
    this.position = isOnBase ? this.start : this.start + this.beltVelocity * tau - (v.base - this.startBase);
    this.need = this.slide * v.normal - v.force + this.stiffness * this.position;
    this.needRate = this.slide * v.normalRate - v.forceRate;
    this.needSecond = this.slide * v.normalSecond - v.forceSecond;
    if (isOnBase) {
      this.need += this.inertia * v.baseAcceleration;
      this.needRate += this.inertia * v.baseJerk;
      this.needSecond += this.inertia * v.baseSnap;
    } else {
      this.need += this.viscous * this.velocity;
      this.needRate += this.stiffness * this.velocity - this.viscous * v.baseAcceleration;
      this.needSecond -= this.stiffness * v.baseAcceleration + this.viscous * v.baseJerk;
    }
    if (this.cubic !== 0) this.addCubic(v.baseAcceleration);
    this.room = this.grip * v.normal + this.constant;
    this.roomRate = this.grip * v.normalRate;
    this.roomSecond = this.grip * v.normalSecond;
  }

  /** What rounding may have made of need at the last `evaluate`. */
  needRounding(): number {
    const { inputs, stiffness, viscous, inertia, position, velocity } = this;
    const own = Math.abs(stiffness * position) + Math.abs(viscous * velocity);
    const force = Math.abs(inputs.force[0]) + Math.abs(inputs.values.force) + inputs.forceBound(0);
    return 2 ** -50 * (own + force + Math.abs(inertia * inputs.values.baseAcceleration));
  }

  private addCubic(baseAcceleration: number): void {
    const { cubic, position: d, velocity } = this;
    const curvature = this.carrier === "base" ? 0 : -baseAcceleration;
    this.need += cubic * d * d * d;
    this.needRate += 3 * cubic * d * d * velocity;
    this.needSecond += 3 * cubic * d * (2 * velocity * velocity + d * curvature);
  }

  /** A bound of |(k3 d³)‴| on [τ, τ + reach]. */
  private cubicBound(reach: number): number {
    const { inputs, cubic } = this;
    if (cubic === 0 || this.carrier === "base") return 0;
    const jerk = 6 * Math.abs(inputs.base[3]) + inputs.baseBound(3);
    const acceleration = Math.abs(2 * inputs.base[2]) + inputs.baseBound(2) + jerk * reach;
    const velocity = Math.abs(this.velocity) + acceleration * reach;
    const d = Math.abs(this.position) + velocity * reach;
    return Math.abs(cubic) * (6 * velocity ** 3 + 18 * d * velocity * acceleration + 3 * d * d * jerk);
  }

  /**
   * A τ up to which need provably stays within room: what is constant, the amplitudes of all harmonics and the drift of
   * linear inputs cannot use it up sooner. 0 where the inputs are curved or nothing is left over.
   */
  holdsUntil(): number {
    const { inputs } = this;
    this.evaluate(0);
    let swing = (Math.abs(this.slide) + this.grip) * inputs.rippleBound(0) + inputs.forceBound(0);
    let drift = Math.abs(inputs.force[1]);
    let isCurved = inputs.force[2] !== 0 || inputs.force[3] !== 0 || inputs.hasSweep;
    if (this.carrier === "base") {
      swing += this.inertia * inputs.baseBound(2);
      isCurved ||= inputs.acceleration[1] !== 0;
    } else {
      swing += this.stiffness * inputs.baseBound(0) + this.viscous * inputs.baseBound(1);
      drift += this.stiffness * Math.abs(this.beltVelocity - inputs.base[1]);
      isCurved ||= inputs.base[2] !== 0 || inputs.base[3] !== 0 || this.cubic !== 0;
    }
    const constant = this.need - this.swingAtStart();
    const left = this.grip * inputs.normal + this.constant - Math.abs(constant) - swing;
    if (isCurved || left < 0) return 0;
    return drift > 0 ? left / drift : Infinity;
  }

  /** What the harmonics have in need(0). */
  private swingAtStart(): number {
    const { inputs } = this;
    let sum = this.slide * inputs.rippleRe;
    for (let i = 0; i < inputs.count; i++) {
      const w = inputs.omega[i];
      sum -= inputs.forceRe[i];
      if (this.carrier === "base") sum -= this.inertia * w * w * inputs.baseRe[i];
      else sum -= this.stiffness * inputs.baseRe[i] - this.viscous * w * inputs.baseIm[i];
    }
    return sum;
  }

  /** A bound of |need‴| and of |room‴| together on [τ, τ + reach], up to the inputs' next corner. */
  thirdBound(reach: number): number {
    const { inputs } = this;
    const ripple = (Math.abs(this.slide) + this.grip) * inputs.rippleBound(3);
    const force = inputs.forceBound(3) + 6 * Math.abs(inputs.force[3]);
    const jerkPolynomial = 6 * Math.abs(inputs.base[3]);
    if (this.carrier === "base") return ripple + force + this.inertia * inputs.baseBound(5);
    return (
      ripple +
      force +
      this.stiffness * (inputs.baseBound(3) + jerkPolynomial) +
      this.viscous * inputs.baseBound(4) +
      this.cubicBound(reach)
    );
  }
}

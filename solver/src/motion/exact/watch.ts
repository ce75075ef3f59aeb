import type { Watched } from "../../numerics/first-zero.ts";
import type { Inputs } from "../inputs.ts";
import type { Carried, Carrier } from "./carried.ts";
import type { Oscillation } from "./oscillation.ts";

/** Held means |need| ≤ room (1 + this), so that rounding never decides. */
export const heldTolerance = 1e-12;

/** sign·v_r of a slip against ground, belt or base. */
export class SlipWatch implements Watched {
  value = 0;
  first = 0;
  second = 0;
  noise = 0;
  sign = 1;
  carrier: Carrier = "ground";
  beltVelocity = 0;

  constructor(
    private readonly oscillation: Oscillation,
    private readonly inputs: Inputs,
  ) {}

  evaluate(tau: number): void {
    const { oscillation, sign } = this;
    oscillation.evaluate(tau);
    this.noise = oscillation.noise;
    if (this.carrier === "base") {
      this.value = sign * oscillation.velocity;
      this.first = sign * oscillation.acceleration;
      this.second = sign * oscillation.jerk;
      return;
    }
    const v = this.inputs.evaluate(tau);
    this.value = sign * (oscillation.velocity + v.baseVelocity - this.beltVelocity);
    this.first = sign * (oscillation.acceleration + v.baseAcceleration);
    this.second = sign * (oscillation.jerk + v.baseJerk);
    this.noise += 2 ** -51 * (Math.abs(v.baseVelocity) + Math.abs(this.beltVelocity));
  }

  thirdBound(reach: number): number {
    const own = this.oscillation.snapBound(reach);
    return this.carrier === "base" ? own : own + this.inputs.baseBound(4);
  }
}

/** sign·d of an oscillation: where the spring passes through its free length. */
export class StretchWatch implements Watched {
  value = 0;
  first = 0;
  second = 0;
  noise = 0;
  sign = 1;

  constructor(private readonly oscillation: Oscillation) {}

  evaluate(tau: number): void {
    const { oscillation, sign } = this;
    oscillation.evaluate(tau);
    this.value = sign * oscillation.position;
    this.first = sign * oscillation.velocity;
    this.second = sign * oscillation.acceleration;
    this.noise = 2 ** -50 * Math.abs(oscillation.position);
  }

  thirdBound(reach: number): number {
    return this.oscillation.jerkBound(reach);
  }
}

/** room (1 + tolerance) − sign·need of a body carried along. */
export class HoldWatch implements Watched {
  value = 0;
  first = 0;
  second = 0;
  noise = 0;
  sign = 1;

  constructor(private readonly carried: Carried) {}

  evaluate(tau: number): void {
    const { carried, sign } = this;
    carried.evaluate(tau);
    this.value = carried.room * (1 + heldTolerance) - sign * carried.need;
    this.first = carried.roomRate - sign * carried.needRate;
    this.second = carried.roomSecond - sign * carried.needSecond;
    this.noise = 0;
  }

  thirdBound(): number {
    return this.carried.thirdBound();
  }
}

/** sign·(u̇ − ẏ) or sign·d of a body carried along: where the second set-valued element changes its side. */
export class CarriedStretchWatch implements Watched {
  value = 0;
  first = 0;
  second = 0;
  noise = 0;
  sign = 1;
  /** True to watch ḋ, false to watch d. */
  isRate = true;

  constructor(
    private readonly carried: Carried,
    private readonly inputs: Inputs,
  ) {}

  evaluate(tau: number): void {
    const { carried, sign } = this;
    carried.evaluate(tau);
    const v = this.inputs.values;
    const chain = [carried.position, carried.velocity, -v.baseAcceleration, -v.baseJerk];
    const at = this.isRate ? 1 : 0;
    this.value = sign * chain[at];
    this.first = sign * chain[at + 1];
    this.second = sign * chain[at + 2] || 0;
    this.noise = 2 ** -50 * Math.abs(chain[at]);
  }

  thirdBound(): number {
    const power = this.isRate ? 4 : 3;
    const polynomial = this.isRate ? 0 : 6 * Math.abs(this.inputs.base[3]);
    return this.inputs.baseBound(power) + polynomial;
  }
}

/** sign·v_r of a body that moves with its base (ḋ = 0) over ground or belt. */
export class CarriedSlipWatch implements Watched {
  value = 0;
  first = 0;
  second = 0;
  noise = 0;
  sign = 1;
  beltVelocity = 0;

  constructor(private readonly inputs: Inputs) {}

  evaluate(tau: number): void {
    const v = this.inputs.evaluate(tau);
    this.value = this.sign * (v.baseVelocity - this.beltVelocity);
    this.first = this.sign * v.baseAcceleration;
    this.second = this.sign * v.baseJerk;
    this.noise = 2 ** -50 * (Math.abs(v.baseVelocity) + Math.abs(this.beltVelocity));
  }

  thirdBound(): number {
    return this.inputs.baseBound(4);
  }
}

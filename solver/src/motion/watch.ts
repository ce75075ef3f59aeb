import type { Watched } from "../numerics/first-zero.ts";
import type { Inputs } from "./inputs.ts";
import type { Carried } from "./carried.ts";

/** Held means |need| ≤ room (1 + this), so that rounding never decides. */
export const heldTolerance = 1e-12;

/** What is watched for its first zero, always times `sign` so that it starts positive. */
export abstract class Watch implements Watched {
  sign = 1;
  value = 0;
  first = 0;
  second = 0;
  noise = 0;
  isTouch = false;
  abstract evaluate(tau: number): void;
  abstract thirdBound(reach: number): number;

  protected take(value: number, first: number, second: number): void {
    this.value = this.sign * value;
    this.first = this.sign * first;
    this.second = this.sign * second;
  }
}

/** room (1 + tolerance) − sign·need of a body carried along. */
export class HoldWatch extends Watch {
  constructor(private readonly carried: Carried) {
    super();
  }

  evaluate(tau: number): void {
    const { carried, sign } = this;
    carried.evaluate(tau);
    this.value = carried.room * (1 + heldTolerance) - sign * carried.need;
    this.first = carried.roomRate - sign * carried.needRate;
    this.second = carried.roomSecond - sign * carried.needSecond;
    this.noise = carried.room === 0 ? carried.needRounding() : 0;
  }

  thirdBound(reach: number): number {
    return this.carried.thirdBound(reach);
  }
}

/**
 * grip·N − side·need of a body that contact and spring hold together: where the contact's share is used up and the spring's
 * element begins to give the rest. No event, but f and S have a corner there.
 */
export class ShareWatch extends Watch {
  side = 1;

  constructor(private readonly carried: Carried) {
    super();
  }

  evaluate(tau: number): void {
    const { carried, side } = this;
    carried.evaluate(tau);
    const share = carried.room - carried.constant;
    this.take(
      share - side * carried.need,
      carried.roomRate - side * carried.needRate,
      carried.roomSecond - side * carried.needSecond,
    );
    this.noise = 2 ** -50 * share;
  }

  thirdBound(reach: number): number {
    return this.carried.thirdBound(reach);
  }

  /**
   * Looks for the next crossing on one side, whichever way it goes; at a crossing, told to within the clock's `blur` s, what
   * the value is about to do tells which. One that stays where it is crosses nothing.
   */
  begin(side: 1 | -1, blur: number): void {
    this.side = side;
    this.sign = 1;
    this.evaluate(0);
    const isAtCrossing = Math.abs(this.value) <= 1e-12 * this.carried.room + blur * Math.abs(this.first);
    const ahead = isAtCrossing ? this.first || this.second || this.value : this.value;
    this.sign = ahead < 0 ? -1 : 1;
  }
}

/** d of a body carried along. */
export class CarriedStretchWatch extends Watch {
  constructor(
    private readonly carried: Carried,
    private readonly inputs: Inputs,
  ) {
    super();
  }

  evaluate(tau: number): void {
    this.carried.evaluate(tau);
    this.take(this.carried.position, this.carried.velocity, -this.inputs.values.baseAcceleration);
  }

  thirdBound(): number {
    return this.inputs.baseBound(3) + 6 * Math.abs(this.inputs.base[3]);
  }
}

/** ẏ − u̇: −ḋ of a body stuck to ground or belt, and v_r of one that moves with its base. */
export class BaseSlipWatch extends Watch {
  constructor(
    private readonly inputs: Inputs,
    private readonly beltVelocity: number,
  ) {
    super();
  }

  evaluate(tau: number): void {
    const v = this.inputs.evaluate(tau);
    this.take(v.baseVelocity - this.beltVelocity, v.baseAcceleration, v.baseJerk);
    this.noise = 2 ** -50 * (Math.abs(v.baseVelocity) + Math.abs(this.beltVelocity));
  }

  thirdBound(): number {
    return this.inputs.baseBound(4);
  }
}

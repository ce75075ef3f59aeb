import type { Carrier } from "../carried.ts";
import type { Inputs } from "../inputs.ts";
import { Watch } from "../watch.ts";
import type { Oscillation } from "./oscillation.ts";

/** v_r of a slip. */
export class SlipWatch extends Watch {
  constructor(
    private readonly oscillation: Oscillation,
    private readonly inputs: Inputs,
    private readonly carrier: Carrier,
  ) {
    super();
  }

  evaluate(tau: number): void {
    const { oscillation } = this;
    oscillation.evaluateSlip(tau);
    this.take(oscillation.slip, oscillation.slipRate, oscillation.slipSecond);
    this.noise = oscillation.noise;
  }

  thirdBound(reach: number): number {
    const own = this.oscillation.snapBound(reach);
    return this.carrier === "base" ? own : own + this.inputs.baseBound(4);
  }
}

/** d of an oscillation: where the spring passes through its free length. */
export class StretchWatch extends Watch {
  constructor(private readonly oscillation: Oscillation) {
    super();
  }

  evaluate(tau: number): void {
    const { oscillation } = this;
    oscillation.evaluate(tau);
    this.take(oscillation.position, oscillation.velocity, oscillation.acceleration);
  }

  thirdBound(reach: number): number {
    return this.oscillation.jerkBound(reach);
  }
}

/** ḋ of an oscillation. */
export class StretchRateWatch extends Watch {
  constructor(private readonly oscillation: Oscillation) {
    super();
  }

  evaluate(tau: number): void {
    const { oscillation } = this;
    oscillation.evaluate(tau);
    this.take(oscillation.velocity, oscillation.acceleration, oscillation.jerk);
    this.noise = oscillation.noise;
  }

  thirdBound(reach: number): number {
    return this.oscillation.snapBound(reach);
  }
}

import type { Problem } from "../../scenario/problem.ts";
import type { Inputs } from "../inputs.ts";

/** g never counts as less than this share of its largest: as N fades the bristles would yield infinitely fast. */
const leastShare = 1e-9;

/** The equation of a body on bristles; unknowns y = [d, ḋ, z], τ from the inputs' origin. */
export class BristleBody {
  private readonly stiffness: number;
  private readonly damping: number;
  private readonly viscous: number;
  /** The largest N of the run, N. */
  private readonly pressing: number;

  constructor(
    private readonly problem: Problem,
    private readonly inputs: Inputs,
  ) {
    this.stiffness = problem.law.bristle?.stiffness ?? 0;
    this.damping = problem.law.bristle?.damping ?? 0;
    this.viscous = problem.viscous + problem.solid.viscous;
    this.pressing = problem.normal + Math.abs(problem.ripple?.amplitude ?? 0);
  }

  /** v_r of the body, m/s or rad/s. */
  slipOf(tau: number, y: ArrayLike<number>): number {
    if (this.problem.counterface === "base") return y[1];
    return y[1] + this.inputs.evaluate(tau).baseVelocity - this.problem.beltVelocity;
  }

  rates(tau: number, y: ArrayLike<number>, out: number[]): void {
    const { problem } = this;
    const slip = this.slipOf(tau, y);
    const v = this.inputs.evaluate(tau);
    out[0] = y[1];
    out[2] = this.bendingRate(slip, y[2], v.normal);
    const friction = this.friction(slip, y[2], v.normal);
    const spring = problem.stiffness * y[0] + problem.cubic * y[0] ** 3;
    out[1] = (v.force - this.viscous * y[1] - spring + friction) / problem.inertia - v.baseAcceleration;
  }

  /** f on the body: −r (σ0 z + σ1 ż + σ2 v), v = r v_r; 0 without contact. */
  friction(slip: number, bending: number, normal: number): number {
    if (!(normal > 0)) return 0;
    const { radius, law } = this.problem;
    const rate = this.bendingRate(slip, bending, normal);
    return -radius * (this.stiffness * bending + this.damping * rate + law.fluid * radius * slip);
  }

  /** ż = v − σ0 |v| z/g(v), g(v) = N μ(v); 0 without contact. */
  private bendingRate(slip: number, bending: number, normal: number): number {
    if (!(normal > 0)) return 0;
    const v = this.problem.radius * slip;
    const most = Math.max(normal, leastShare * this.pressing) * this.problem.law.coefficient(Math.abs(v));
    return v - (this.stiffness * Math.abs(v) * bending) / most;
  }

  /** The fastest rate, the bristles' own included, 1/s. */
  rate(y: ArrayLike<number>): number {
    const { inertia, radius, stiffness, cubic } = this.problem;
    const held = stiffness + 3 * Math.abs(cubic) * y[0] ** 2 + radius ** 2 * this.stiffness;
    const damped = this.viscous + radius ** 2 * (this.damping + this.problem.law.fluid);
    return Math.max(Math.sqrt(held / inertia), damped / inertia, this.slowRate());
  }

  /** The fastest rate of spring and inputs alone, 1/s: no step is longer than a radian of it. */
  slowRate(): number {
    const { inertia, stiffness, seconds } = this.problem;
    return Math.max(Math.sqrt(stiffness / inertia), this.inputs.fastest()) || 4 / seconds;
  }

  /** Typical sizes of the unknowns. */
  sizes(y: ArrayLike<number>, rate: number): number[] {
    const { problem } = this;
    const v = this.inputs.evaluate(0);
    const bending = (problem.law.atRest * this.pressing) / this.stiffness;
    const speed = Math.max(Math.abs(y[1]), Math.abs(problem.beltVelocity), Math.abs(v.baseVelocity));
    // without a spring the place does not matter
    const stretch = problem.stiffness > 0 || problem.cubic !== 0 ? Math.abs(y[0]) : 0;
    const size = Math.max(stretch, bending / problem.radius, speed / rate) || 1;
    return [size, size * rate, bending || size];
  }
}

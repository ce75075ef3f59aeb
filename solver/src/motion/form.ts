import type { Problem } from "../scenario/problem.ts";
import { Inputs } from "./inputs.ts";
import { Carried, type Carrier } from "./carried.ts";
import { slidingFriction } from "./sliding-friction.ts";
import type { Slip } from "./slip.ts";
import type { Stance } from "./stance.ts";

/** Which of the three kinds a segment is of: a slip; a slip with ḋ held at 0 by the spring's own element; a stick. */
export type Kind = "slip" | "lock" | "stick";

/** Makes the method's slip for a problem. */
export type SlipMaker = (problem: Problem, inputs: Inputs) => Slip;

/** How one problem's segments go, set up for one segment at a time. */
export class Form {
  readonly inputs: Inputs;
  readonly slip: Slip;
  readonly carried = new Carried();
  /** c + c_h. */
  readonly viscous: number;
  /** ρ k, the slope of the second set-valued element, N/m. */
  readonly elementSlope: number;
  readonly hasElement: boolean;
  /** μs r, and μ r right after break-away: force per N of pressing. */
  readonly grip: number;
  readonly slide: number;
  readonly contactCarrier: Carrier;
  kind: Kind = "slip";

  private readonly body = { inertia: 0, stiffness: 0, viscous: 0, cubic: 0 };
  private readonly friction = { slide: 0, grip: 0, constant: 0 };

  constructor(
    readonly problem: Problem,
    makeSlip: SlipMaker,
  ) {
    this.inputs = new Inputs(problem);
    this.viscous = problem.viscous + problem.solid.viscous;
    this.elementSlope = problem.solid.proportional * problem.stiffness;
    this.hasElement = this.elementSlope > 0;
    this.grip = problem.law.atRest * problem.radius;
    this.slide = problem.law.atOnset * problem.radius;
    this.contactCarrier = problem.counterface;
    this.slip = makeSlip(problem, this.inputs);
    this.body.inertia = problem.inertia;
    this.body.viscous = this.viscous;
    this.body.cubic = problem.cubic;
  }

  /** Locates the inputs at the stance and makes its segment ready; `slip` or `carried` then evaluate in τ. */
  begin(s: Stance): void {
    this.inputs.locate(s.t);
    this.take(s);
  }

  /** As `begin`, for inputs already located at s.t. */
  take(s: Stance): void {
    const { inputs, problem } = this;
    if (s.contact === 0) return this.takeStick(s);
    if (s.spring === 0) {
      this.kind = "lock";
      this.friction.slide = s.contact * this.slideAt(s.slip);
      this.friction.grip = 0;
      this.friction.constant = this.elementSlope * Math.abs(s.position);
      this.body.stiffness = problem.stiffness;
      this.carried.begin(inputs, "base", 0, this.body, this.friction, s.position);
      return;
    }
    this.kind = "slip";
    this.body.stiffness = this.stiffnessOf(s);
    this.slip.begin(inputs, this.body, s);
  }

  /** Friction per N of pressing at a sliding velocity that lasts (a body at rest over a belt). */
  private slideAt(slip: number): number {
    const { law } = this.problem;
    if (law.constant !== null) return this.slide;
    const normal = this.inputs.evaluate(0).normal;
    return normal > 0 ? slidingFriction(this.problem, slip, normal) / normal : 0;
  }

  /** k (1 ± ρ) by the quadrant, or k where the element holds or is absent. */
  stiffnessOf(s: Stance): number {
    return this.problem.stiffness + s.spring * s.side * this.elementSlope;
  }

  /** The counterface's velocity u̇ at the inputs' last evaluated instant. */
  counterfaceVelocity(): number {
    if (this.contactCarrier === "base") return this.inputs.values.baseVelocity;
    return this.problem.beltVelocity;
  }

  /** True where u̇ = ẏ up to the next corner, so that a stuck body keeps its deflection. */
  isCarriedWithBase(): boolean {
    if (this.contactCarrier === "base") return true;
    return this.inputs.isBaseSteady() && this.inputs.base[1] === this.problem.beltVelocity;
  }

  private takeStick(s: Stance): void {
    this.kind = "stick";
    const isHeldByBoth = s.spring === 0;
    this.friction.slide = 0;
    this.friction.grip = this.grip;
    this.friction.constant = isHeldByBoth ? this.elementSlope * Math.abs(s.position) : 0;
    this.body.stiffness = this.stiffnessOf(s);
    const { contactCarrier: carrier, problem } = this;
    this.carried.begin(this.inputs, carrier, problem.beltVelocity, this.body, this.friction, s.position);
  }
}

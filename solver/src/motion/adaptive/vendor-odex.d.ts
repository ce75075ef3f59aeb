/** The part of odex 2.0.4 that is used. Its own types are its TypeScript source, which strict checking refuses. */
export class Solver {
  constructor(n: number);
  relativeTolerance: number | number[];
  absoluteTolerance: number | number[];
  initialStepSize: number;
  maxStepSize: number;
  maxSteps: number;
  denseOutput: boolean;
  stabilityCheckCount: number;
  /** `y` must be a plain array; `solOut` may return false to stop (the result's xEnd is then still the requested one). */
  solve(
    f: (x: number, y: number[]) => number[],
    x: number,
    y: number[],
    xEnd: number,
    solOut: (
      n: number,
      xOld: number,
      x: number,
      y: number[],
      dense?: (i: number, x: number) => number,
    ) => boolean | void,
  ): { outcome: number; nEval: number };
}

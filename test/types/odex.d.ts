/** What the tests use of odex 2.0.4, which ships no typings: an extrapolation integrator, the independent reference. */
export type Derivative = (x: number, y: number[]) => number[];

export type OutputFunction = (
  acceptedSteps: number,
  previous: number,
  x: number,
  y: number[],
  /** Value of a component within the step; false unless `denseOutput` is set. */
  interpolate: false | ((component: number, x: number) => number),
) => boolean | undefined;

export interface Solution {
  y: number[];
  /** 0 converged, 1 too many steps, 2 stopped by the output function. */
  outcome: 0 | 1 | 2;
  nStep: number;
  xEnd: number;
  nAccept: number;
  nReject: number;
  nEval: number;
}

export class Solver {
  constructor(equations: number);
  absoluteTolerance: number | number[];
  relativeTolerance: number | number[];
  maxSteps: number;
  initialStepSize: number;
  maxStepSize: number;
  denseOutput: boolean;
  /** Which components it covers; all if absent. */
  denseComponents: number[];
  solve(f: Derivative, x: number, y0: number[], xEnd: number, output?: OutputFunction): Solution;
}

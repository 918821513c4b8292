/** What an integrator of ordinary differential equations takes and returns; one unit of time throughout. */

/**
 * dy/dt: writes the derivative of `state` at `time` into `derivative`, every component, and changes nothing else.
 * Where the derivative does not exist it writes NaN; what it throws reaches the caller of `integrate`.
 */
export type RightHandSide = (time: number, state: Float64Array, derivative: Float64Array) => void;

export interface IntegrationOptions {
  /** Local error allowed a step relative to each component; below 2e-15 it counts as 2e-15. */
  readonly relativeTolerance: number;
  /** Local error allowed a step in the component's own unit, one for all or one each; 0 or more. */
  readonly absoluteTolerance: number | Float64Array;
  /** Limit on attempted steps, accepted and rejected together. */
  readonly maximumSteps: number;
  /** Length of the first attempt, in the unit of time; chosen from the derivatives if absent or not positive. */
  readonly initialStep?: number;
  /** Longest step, in the unit of time; the whole interval if absent or not positive. */
  readonly maximumStep?: number;
}

export interface AcceptedStep {
  readonly start: number;
  readonly end: number;
  readonly before: Float64Array;
  readonly after: Float64Array;
  /**
   * Dense output of one component at a time within the step, NaN for a component that does not exist; the three extra
   * stages are evaluated on first use only.
   */
  interpolate(time: number, component: number): number;
  /** Dense output of all components at a time within the step. */
  interpolateAll(time: number, into: Float64Array): void;
}

/**
 * Called after each accepted step; return true to stop there. The step and its arrays are reused and mean something
 * only during the call: copy what you keep.
 */
export type StepObserver = (step: AcceptedStep) => boolean;

export interface IntegrationOutcome {
  /** `reached` the end, `stopped` by the observer, or the reason for ending early at `time`. */
  readonly status: 'reached' | 'stopped' | 'too-many-steps' | 'not-finite' | 'step-too-small';
  readonly time: number;
  /** State at `time`: the last accepted one. */
  readonly state: Float64Array;
  /** Accepted steps. */
  readonly steps: number;
  readonly rejected: number;
  /** Calls of the right-hand side. */
  readonly evaluations: number;
}

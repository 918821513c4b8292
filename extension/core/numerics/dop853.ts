/**
 * Adaptive explicit Runge–Kutta integration of order 8(5,3) for small non-stiff systems, with dense output of order 7.
 * Source: E. Hairer, S. P. Nørsett and G. Wanner, Solving Ordinary Differential Equations I, 2nd ed., Springer 1993,
 * sections II.4 (step control, starting step), II.5 and II.10 (the method).
 */
import { evaluateDense, prepareDense, takeDenseStages } from './dop853_dense.ts';
import { createWorkspace, errorNorm, takeStep, type Workspace } from './dop853_tableau.ts';

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
  /** Dense output of one component at a time within the step; the three extra stages are evaluated on first use only. */
  interpolate(time: number, component: number): number;
  /** Dense output of all components at a time within the step. */
  interpolateAll(time: number, into: Float64Array): void;
}

/** Called after each accepted step; return true to stop there. The step and its arrays are reused: copy what you keep. */
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

/**
 * Integrates dy/dt = rhs(t, y) from `initial` at `start` to `end`, forwards or backwards.
 * Numbers that are not finite, given or met, end as `not-finite`; the arrays given are not changed.
 */
export function integrate(
  rhs: RightHandSide,
  start: number,
  initial: Float64Array,
  end: number,
  options: IntegrationOptions,
  observe?: StepObserver,
): IntegrationOutcome {
  const n = initial.length;
  const w = createWorkspace(n);
  const { y, next, k1, k13 } = w;
  y.set(initial);
  let time = start;
  let steps = 0;
  let rejected = 0;
  let evaluations = 0;
  const outcome = (status: IntegrationOutcome['status']): IntegrationOutcome => {
    return { status, time, state: y.slice(), steps, rejected, evaluations };
  };

  const span = Math.abs(end - start);
  const relativeTolerance = Math.max(options.relativeTolerance, 2e-15);
  fillTolerance(w, options.absoluteTolerance);
  if (!Number.isFinite(span + relativeTolerance) || !allFinite(y, w.absoluteTolerance)) return outcome('not-finite');
  if (span === 0 || n === 0) {
    time = end;
    return outcome('reached');
  }

  const direction = end > start ? 1 : -1;
  const longest = positiveOr(options.maximumStep, span);
  rhs(time, y, k1);
  evaluations++;
  if (!allFinite(k1, k1)) return outcome('not-finite');
  let h = positiveOr(options.initialStep, 0);
  if (h === 0) {
    h = startingStep(rhs, w, time, direction * span, relativeTolerance);
    evaluations++;
  }
  h = direction * Math.min(h, longest);

  const view = createStepView(rhs, w, () => {
    evaluations += 3;
  });
  let afterRejection = false;
  let finite = true;
  while (steps + rejected < options.maximumSteps) {
    // Stretching by 1 % avoids a last step of rounding-error length.
    const last = direction * (time + 1.01 * h - end) >= 0;
    if (last) h = end - time;
    else if (Math.abs(h) <= Math.max(2e-15 * Math.abs(time), 1e-30 * span)) {
      return outcome(finite ? 'step-too-small' : 'not-finite');
    }

    takeStep(rhs, w, time, h);
    evaluations += 11;
    const error = errorNorm(w, h, relativeTolerance);
    // The eighth root.
    const ratio = Math.sqrt(Math.sqrt(Math.sqrt(error))) / 0.9;
    finite = Number.isFinite(error);
    if (!(error <= 1)) {
      h *= finite ? Math.max(1 / ratio, 1 / 3) : 0.1;
      afterRejection = true;
      rejected++;
      continue;
    }

    const stepEnd = last ? end : time + h;
    rhs(stepEnd, next, k13);
    evaluations++;
    finite = allFinite(next, k13);
    if (!finite) {
      h *= 0.1;
      afterRejection = true;
      rejected++;
      continue;
    }

    steps++;
    const stop = observe?.(view.show(time, stepEnd, h)) === true;
    time = stepEnd;
    for (let i = 0; i < n; i++) {
      y[i] = next[i]!;
      k1[i] = k13[i]!;
    }
    if (stop) return outcome('stopped');
    if (last) return outcome('reached');
    // No growth straight after a rejection: it would mostly be rejected again.
    h *= Math.min(1 / ratio, afterRejection ? 1 : 6);
    if (Math.abs(h) > longest) h = direction * longest;
    afterRejection = false;
  }
  return outcome('too-many-steps');
}

/** The one step object handed to the observer, refilled by `show`. */
function createStepView(rhs: RightHandSide, w: Workspace, onDenseStages: () => void) {
  const prepared = new Uint8Array(w.n);
  let staged = false;
  let h = 0;
  const step = {
    start: 0,
    end: 0,
    before: w.y,
    after: w.next,
    interpolate(time: number, component: number): number {
      if (!(component >= 0 && component < w.n)) return Number.NaN;
      if (!staged) {
        takeDenseStages(rhs, w, step.start, h);
        onDenseStages();
        prepared.fill(0);
        staged = true;
      }
      if (prepared[component] !== 1) {
        prepareDense(w, h, component);
        prepared[component] = 1;
      }
      return evaluateDense(w, component, (time - step.start) / h);
    },
    interpolateAll(time: number, into: Float64Array): void {
      for (let i = 0; i < w.n; i++) into[i] = step.interpolate(time, i);
    },
  };
  const show = (start: number, end: number, length: number): AcceptedStep => {
    step.start = start;
    step.end = end;
    h = length;
    staged = false;
    return step;
  };
  return { show };
}

/**
 * Length of the first step, book section II.4, with time counted in units of the interval so that the choice does not
 * depend on the unit. One evaluation.
 */
function startingStep(rhs: RightHandSide, w: Workspace, time: number, span: number, relativeTolerance: number): number {
  const { n, y, trial, k1, k2, absoluteTolerance } = w;
  let size = 0;
  let slope = 0;
  for (let i = 0; i < n; i++) {
    const scale = absoluteTolerance[i]! + relativeTolerance * Math.abs(y[i]!);
    size += (y[i]! / scale) ** 2;
    slope += ((span * k1[i]!) / scale) ** 2;
  }
  const guess = size <= 1e-10 || slope <= 1e-10 ? 1e-6 : Math.min(0.01 * Math.sqrt(size / slope), 1);
  for (let i = 0; i < n; i++) trial[i] = y[i]! + guess * span * k1[i]!;
  rhs(time + guess * span, trial, k2);
  let curvature = 0;
  for (let i = 0; i < n; i++) {
    const scale = absoluteTolerance[i]! + relativeTolerance * Math.abs(y[i]!);
    curvature += ((span * (k2[i]! - k1[i]!)) / scale) ** 2;
  }
  const largest = Math.max(Math.sqrt(slope), Math.sqrt(curvature) / guess);
  const refined = largest <= 1e-15 ? Math.max(1e-6, 1e-3 * guess) : (0.01 / largest) ** (1 / 8);
  const fraction = Math.min(100 * guess, refined, 1);
  return Math.abs(span) * (fraction > 0 ? fraction : 1e-6);
}

/** A floor far below any quantity keeps 0/0 out of the error norm when a component and its tolerance are zero. */
function fillTolerance(w: Workspace, tolerance: number | Float64Array): void {
  for (let i = 0; i < w.n; i++) {
    const given = typeof tolerance === 'number' ? tolerance : (tolerance[i] ?? Number.NaN);
    w.absoluteTolerance[i] = Math.max(given, 1e-100);
  }
}

function positiveOr(value: number | undefined, otherwise: number): number {
  return value !== undefined && value > 0 ? value : otherwise;
}

/** Whether both arrays hold finite numbers only: any other times zero is NaN. */
function allFinite(a: Float64Array, b: Float64Array): boolean {
  let sum = 0;
  for (let i = 0; i < a.length; i++) sum += 0 * a[i]! + 0 * b[i]!;
  return sum === 0;
}

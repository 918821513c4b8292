/**
 * Adaptive explicit Runge–Kutta integration of order 8(5,3) for small non-stiff systems, with dense output of order 7.
 * Source: E. Hairer, S. P. Nørsett and G. Wanner, Solving Ordinary Differential Equations I, 2nd ed., Springer 1993,
 * sections II.4 (step control, starting step), II.5 and II.10 (the method).
 */
import { createStepView } from './dop853_dense.ts';
import { startingStep } from './dop853_start.ts';
import { createWorkspace, takeStep, type Workspace } from './dop853_tableau.ts';
import type { IntegrationOptions, IntegrationOutcome, RightHandSide, StepObserver } from './integration.ts';

export type {
  AcceptedStep,
  IntegrationOptions,
  IntegrationOutcome,
  RightHandSide,
  StepObserver,
} from './integration.ts';

/** Share taken of the step that would just meet the tolerance; over pulses and orbits 0.85 took about the fewest calls. */
const safety = 0.85;

/**
 * Factor on the step after an accepted one: the smaller of what this step's error allows and what the trend of the last
 * two errors predicts, which at the rise of a pulse saves most rejections. Source of the trend: E. Hairer and G. Wanner,
 * Solving Ordinary Differential Equations II, 2nd ed., Springer 1996, section IV.8, after K. Gustafsson.
 */
function growth(root: number, previousRoot: number, lengthRatio: number, afterRejection: boolean): number {
  const trend = (safety * lengthRatio * previousRoot) / (root * root);
  // No growth straight after a rejection: it would mostly be rejected again.
  return Math.max(Math.min(safety / root, trend, afterRejection ? 1 : 6), 1 / 3);
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
  let previousLength = 0;
  let previousRoot = 1;
  let finite = true;
  while (steps + rejected < options.maximumSteps) {
    // Stretching by 1 % avoids a last step of rounding-error length.
    const last = direction * (time + 1.01 * h - end) >= 0;
    if (last) h = end - time;
    else if (Math.abs(h) <= Math.max(2e-15 * Math.abs(time), 1e-30 * span)) {
      return outcome(finite ? 'step-too-small' : 'not-finite');
    }

    const error = takeStep(rhs, w, time, h, relativeTolerance);
    evaluations += 11;
    // The local error goes with the eighth power of the step.
    const root = Math.sqrt(Math.sqrt(Math.sqrt(error)));
    finite = Number.isFinite(error);
    if (!(error <= 1)) {
      h *= finite ? Math.max(safety / root, 1 / 3) : 0.1;
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
    const length = Math.abs(h);
    h *= growth(root, previousRoot, length / previousLength, afterRejection);
    if (Math.abs(h) > longest) h = direction * longest;
    previousLength = length;
    previousRoot = Math.max(root, 0.3);
    afterRejection = false;
  }
  return outcome('too-many-steps');
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

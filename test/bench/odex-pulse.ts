import { Solver } from 'odex';
import { maximumBetween } from '../../extension/core/numerics/maximum.ts';
import { rootBetween } from '../../extension/core/numerics/root.ts';
import type { Case } from './cases.ts';
import { type Curve, sampled } from './curve.ts';

/** What odex integrates besides the rings' gain: the field itself, or the logarithm that our integrator uses. */
export type Formulation = 'raw' | 'log';

export interface OdexSettings {
  readonly formulation: Formulation;
  /** Relative for everything, absolute for a ring's gain over a tenth of the whole. */
  readonly tolerance: number;
  /** Absolute for the field, over the relative one. */
  readonly fieldTolerance: number;
  /** With the peak and the width, which takes dense output; otherwise the energy only. */
  readonly figures: boolean;
}

export interface OdexPulse {
  /** As in `depletion.ts`: energy, peak and width in their own units. */
  readonly endsAt: number;
  readonly peak: number;
  readonly width: number;
  readonly evaluations: number;
}

/** State: the field F or ln(F + seed), then the gain of each ring; time in round trips from the opening. */
export function odexPulse({ cavity, depletion }: Case, settings: OdexSettings): OdexPulse | undefined {
  const { loss, intensity, gain } = depletion;
  const { formulation, tolerance, figures } = settings;
  const n = gain.length;
  const whole = sum([0, ...gain]);
  const seed = (whole / (whole - loss)) * cavity.photonField;
  const log = formulation === 'log';
  const derivative = (_time: number, y: number[]): number[] => {
    const out = new Array<number>(n + 1);
    const grown = log ? Math.exp(y[0]!) : y[0]!;
    const field = log ? grown - seed : grown;
    let now = 0;
    for (let k = 1; k <= n; k++) {
      now += y[k]!;
      out[k] = -intensity[k - 1]! * y[k]! * field;
    }
    const excess = now - loss;
    out[0] = log
      ? excess + (now * cavity.photonField - excess * seed) / grown
      : excess * field + now * cavity.photonField;
    return out;
  };
  const levelOf = (field: number) => (log ? Math.log(field + seed) : field);
  const fieldOf = (level: number) => (log ? Math.exp(level) - seed : level);
  const solver = new Solver(n + 1);
  solver.relativeTolerance = tolerance;
  solver.absoluteTolerance = [tolerance * settings.fieldTolerance, ...gain.map(() => tolerance * whole * 0.1)];
  solver.initialStepSize = 1;
  solver.maxSteps = 100_000;
  solver.denseOutput = figures;
  if (figures) solver.denseComponents = [0];
  let peak = Number.NaN;
  let highest = 0;
  let fall = Number.NaN;
  const curves: Curve[] = [];
  const solution = solver.solve(derivative, 0, [levelOf(0), ...gain], 1e6, (count, from, to, y, interpolate) => {
    if (count === 1) return true;
    const field = fieldOf(y[0]!);
    highest = Math.max(highest, field);
    if (interpolate) {
      const course = (time: number) => interpolate(0, time);
      if (Number.isNaN(peak)) {
        const now = sum(y);
        // The rise through half the peak lies where the field has taken some of the excess gain.
        if (whole - now > 0.05 * (now - loss)) curves.push(sampled(course, from, to));
        if (now < loss) peak = fieldOf(maximumBetween(course, from, to, 1e-6).value);
      }
      const half = levelOf(peak / 2);
      if (Number.isNaN(fall) && y[0]! < half) fall = rootBetween((time) => course(time) - half, from, to) ?? Number.NaN;
    }
    return field > 1e-10 * highest;
  });
  const half = levelOf(peak / 2);
  const rise = curves.map((curve) => curve.crossing(half)).find((time) => time !== undefined) ?? Number.NaN;
  let used = 0;
  for (let k = 0; k < n; k++) used += (gain[k]! - solution.y[k + 1]!) / intensity[k]!;
  // All that the ions gave has left by the loss.
  return { endsAt: used / loss, peak, width: fall - rise, evaluations: solution.nEval };
}

/** Of all but the first. */
function sum(y: ArrayLike<number>): number {
  let total = 0;
  for (let k = 1; k < y.length; k++) total += y[k]!;
  return total;
}

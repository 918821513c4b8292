import { type AcceptedStep, type IntegrationOutcome, integrate, type RightHandSide } from '../numerics/dop853.ts';
import { rootBetween } from '../numerics/root.ts';
import type { Cavity } from './cavity.ts';
import { smallSignalGain } from './depletion.ts';
import { openingLoss, openingStart } from './opening.ts';
import { createTrace, type Trace } from './trace.ts';

/** A pulse from time integration. Times in s from the first instant of opening, photons in the mode. */
export interface IntegratedPulse {
  readonly peakPhotons: number;
  readonly peakTime: number;
  /** Full width at half maximum. */
  readonly width: number;
  /** Field has fallen to 1 % of the peak. */
  readonly endTime: number;
  /** The field grows again after this pulse. */
  readonly followed: boolean;
  /** x reached at the end, as in `depletion.ts`. */
  readonly depletion: number;
  /** Each ring's share of the gain after the pulse that its upper level holds. */
  readonly left: Float64Array;
  readonly trace: Trace;
  readonly statistics: { readonly steps: number; readonly evaluations: number };
}

/** A lower level that empties on its own: n = N_u − κN_l, dN_l/dt = stimulated rate − N_l/lifetime (s). */
export interface LowerLevel {
  readonly weight: number;
  readonly lifetime: number;
}

/** Indices into the state: ln(1 + φ), x, then the upper levels of all rings, then the lower ones. */
const FIELD = 0;
const DEPLETION = 1;
const RINGS = 2;
/** The pulse is over where the field has fallen to e^−23 (1e-10) of its peak. */
const TAIL = 23;
const HUNDREDTH = Math.log(100);
/** A pulse takes some 60 steps; one that takes so many more is none. */
const MOST_STEPS = 4000;

/**
 * The rate equations with their spontaneous source, ring by ring:
 * dφ/dt = [(G − loss(t))φ + G]/t_r and dN/dt = −ψ n dx/dt with dx/dt = 2γσφ/(A t_r), solved for ln(1 + φ),
 * in which build-up is a straight line. Undefined where no pulse ends before `until` (s).
 * Independent of the depletion form; both must agree where the switch opens at once.
 */
export function integratePulse(
  cavity: Cavity,
  gain: Float64Array,
  photons: number,
  until: number,
  lower?: LowerLevel,
  tolerance = 1e-10,
): IntegratedPulse | undefined {
  const count = gain.length;
  const initial = new Float64Array(RINGS + (lower ? 2 : 1) * count);
  const opening = openingStart(cavity, smallSignalGain(gain), photons);
  initial[FIELD] = Math.log1p(opening.photons);
  initial.set(gain, RINGS);
  const rhs = rateEquations(cavity, count, lower);
  const trace = createTrace(count, lower?.weight ?? 0);
  let peak = { time: Number.NaN, field: Number.NEGATIVE_INFINITY };
  let halfTime = Number.NaN;
  let endTime = Number.NaN;
  let followed = false;
  const slope = new Float64Array(initial.length);
  const scratch = new Float64Array(initial.length);
  const growth = (step: AcceptedStep, time: number) => {
    step.interpolateAll(time, scratch);
    rhs(time, scratch, slope);
    return slope[FIELD]!;
  };
  const crossing = (step: AcceptedStep, level: number) => {
    const from = Math.max(step.start, peak.time);
    return rootBetween((time) => step.interpolate(time, FIELD) - level, from, step.end) ?? Number.NaN;
  };
  const observe = (step: AcceptedStep): boolean => {
    trace.add(step);
    const field = step.after[FIELD]!;
    if (Number.isNaN(peak.time)) {
      rhs(step.end, step.after, slope);
      if (slope[FIELD]! >= 0 || field < 1) return false;
      const time = rootBetween((at) => growth(step, at), step.start, step.end);
      if (time === undefined) return false;
      peak = { time, field: step.interpolate(time, FIELD) };
    }
    if (Number.isNaN(halfTime) && field < peak.field - Math.LN2) halfTime = crossing(step, peak.field - Math.LN2);
    if (Number.isNaN(endTime) && field < peak.field - HUNDREDTH) endTime = crossing(step, peak.field - HUNDREDTH);
    rhs(step.end, step.after, slope);
    if (slope[FIELD]! > 0 && !Number.isNaN(halfTime)) {
      // The loss still falls, or the inversion refills: another pulse follows, and this one ends between them.
      followed = true;
      endTime = Number.isNaN(endTime) ? step.end : endTime;
    }
    return followed || field < peak.field - TAIL;
  };
  const options = {
    relativeTolerance: tolerance,
    absoluteTolerance: absoluteTolerances(initial, gain, tolerance),
    maximumSteps: MOST_STEPS,
  };
  const { openingTime } = cavity.module.qSwitch;
  let outcome: IntegrationOutcome | undefined;
  let evaluations = 0;
  let steps = 0;
  for (const [from, to] of [
    [opening.time, Math.min(openingTime, until)],
    [openingTime, until],
  ] as const) {
    if (!(to > from) || outcome?.status === 'stopped') continue;
    outcome = integrate(rhs, from, outcome?.state ?? initial, to, options, observe);
    evaluations += outcome.evaluations;
    steps += outcome.steps;
    if (outcome.status !== 'reached' && outcome.status !== 'stopped') return undefined;
  }
  const rise = trace.rises(peak.field - Math.LN2);
  if (outcome === undefined || !(endTime > halfTime) || rise === undefined) return undefined;
  return {
    peakPhotons: Math.expm1(peak.field),
    peakTime: peak.time,
    width: halfTime - rise,
    endTime,
    followed,
    depletion: outcome.state[DEPLETION]!,
    left: outcome.state.slice(RINGS, RINGS + count),
    trace,
    statistics: { steps, evaluations },
  };
}

function rateEquations(cavity: Cavity, count: number, lower: LowerLevel | undefined): RightHandSide {
  const { roundTripTime, photonField, loss } = cavity;
  const { openingTime } = cavity.module.qSwitch;
  const psi = cavity.rings.intensity;
  const perTrip = 1 / roundTripTime;
  return (time, state, derivative) => {
    const photons = Math.expm1(state[FIELD]!);
    const pace = photonField * photons * perTrip;
    let gain = 0;
    for (let k = 0; k < count; k++) {
      const upper = state[RINGS + k]!;
      const below = lower ? state[RINGS + count + k]! : 0;
      const inversion = lower ? upper - lower.weight * below : upper;
      const rate = psi[k]! * inversion * pace;
      gain += inversion;
      derivative[RINGS + k] = -rate;
      if (lower) derivative[RINGS + count + k] = rate - below / lower.lifetime;
    }
    const closing = time < openingTime ? openingLoss(cavity, time) : 0;
    derivative[FIELD] = (gain - ((loss + closing) * photons) / (1 + photons)) * perTrip;
    derivative[DEPLETION] = pace;
  };
}

/** Rings count by their share in the gain, the field by its logarithm, depletion by its size. */
function absoluteTolerances(initial: Float64Array, gain: Float64Array, tolerance: number): Float64Array {
  const whole = smallSignalGain(gain.map(Math.abs));
  return initial.map((_, i) => (i < RINGS ? tolerance : tolerance * whole * 0.1));
}

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

/** Indices into the state: ln(φ + seed), x, then the upper levels of all rings, then the lower ones. */
const FIELD = 0;
const DEPLETION = 1;
const RINGS = 2;
/** The pulse is over where the field has fallen to this part of its peak, or nearly to what is emitted spontaneously. */
const TAIL = 1e-10;
/** About the part of the peak from which on the trace is kept: there the field has taken this part of the excess gain. */
const SHOWN = 3e-4;
/**
 * A lower level that lives for less than this part of the time in which the field grows e-fold holds just what it is
 * fed, N_l = lifetime · stimulated rate: following it would cost steps and change the pulse by less than 1e-5.
 */
const PROMPT = 4e-3;
/** A pulse takes some 50 steps; one that takes so many more is none. */
const MOST_STEPS = 4000;

/**
 * The rate equations with their spontaneous source, ring by ring:
 * dφ/dt = [(G − loss(t))φ + G]/t_r and dN/dt = −ψ n dx/dt with dx/dt = 2γσφ/(A t_r), solved for ln(φ + seed) with
 * seed = G/(G − δ), in which build-up is a straight line. Undefined where no pulse ends before `until` (s).
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
  const whole = smallSignalGain(gain);
  const seed = whole > cavity.loss ? whole / (whole - cavity.loss) : 1;
  const { openingTime } = cavity.module.qSwitch;
  const prompt = lower !== undefined && lower.lifetime * (whole - cavity.loss) < PROMPT * cavity.roundTripTime;
  const followedLower = prompt ? undefined : lower;
  const lag = prompt ? lower.weight * lower.lifetime : 0;
  const initial = new Float64Array(RINGS + (followedLower ? 2 : 1) * count);
  const opening = openingStart(cavity, whole, photons);
  initial[FIELD] = Math.log(opening.photons + seed);
  initial.set(gain, RINGS);
  const rhs = rateEquations(cavity, count, seed, lag, followedLower);
  const trace = createTrace(count, seed, followedLower?.weight ?? 0);
  const takes = depletable(cavity, gain) / SHOWN;
  const slope = new Float64Array(initial.length);
  const gainOf = (time: number, state: Float64Array) => {
    if (lag === 0) return gainIn(state, count, followedLower?.weight ?? 0);
    rhs(time, state, slope);
    let taken = 0;
    for (let i = RINGS; i < state.length; i++) taken -= slope[i]! / cavity.rings.intensity[i - RINGS]!;
    return slope[DEPLETION]! > 0 ? taken / slope[DEPLETION]! : whole;
  };
  const lossAt = (time: number) => cavity.loss + (time < openingTime ? openingLoss(cavity, time) : 0);
  let peakTime = Number.NaN;
  let peakPhotons = Number.NaN;
  let halfTime = Number.NaN;
  let endTime = Number.NaN;
  let followed = false;
  const final = new Float64Array(initial.length);
  /** When the field falls through a part of its peak, if it does so in this step. */
  const falls = (step: AcceptedStep, part: number) => {
    const level = Math.log(part * peakPhotons + seed);
    if (!(step.after[FIELD]! < level)) return Number.NaN;
    const from = Math.max(step.start, peakTime);
    return rootBetween((time) => step.interpolate(time, FIELD) - level, from, step.end) ?? Number.NaN;
  };
  const observe = (step: AcceptedStep): boolean => {
    const now = gainOf(step.end, step.after);
    const excess = now - lossAt(step.end);
    const field = Math.exp(step.after[FIELD]!) - seed;
    if (Number.isNaN(peakTime)) {
      if (step.after[DEPLETION]! * takes > excess) trace.add(step);
      if (excess * field + now >= 0 || field < 1) return false;
      peakTime = turningPoint(step);
      peakPhotons = Math.exp(step.interpolate(peakTime, FIELD)) - seed;
    } else if (Math.exp(step.before[FIELD]!) > SHOWN * peakPhotons) trace.add(step);
    if (Number.isNaN(halfTime)) halfTime = falls(step, 0.5);
    if (Number.isNaN(endTime)) endTime = falls(step, 0.01);
    if (excess > 0 && !Number.isNaN(halfTime)) {
      // The loss still falls, or the inversion refills: another pulse follows, and this one ends where the field is least.
      const least = turningPoint(step);
      followed = true;
      endTime = Number.isNaN(endTime) ? least : endTime;
      step.interpolateAll(least, final);
    }
    const settled = -excess * field < 2 * now && step.end >= openingTime && !lower && !Number.isNaN(endTime);
    return followed || settled || field < TAIL * peakPhotons;
  };
  // Rings count by their share in the gain.
  const share = tolerance * smallSignalGain(gain.map(Math.abs)) * 0.1;
  const options = {
    relativeTolerance: tolerance,
    absoluteTolerance: initial.map((_, i) => (i < RINGS ? tolerance : share)),
    maximumSteps: MOST_STEPS,
  };
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
  if (outcome && !followed) final.set(outcome.state);
  const rise = trace.rises(peakPhotons / 2);
  if (outcome === undefined || !(endTime > halfTime) || rise === undefined) return undefined;
  return {
    peakPhotons,
    peakTime,
    width: halfTime - rise,
    endTime,
    followed,
    depletion: final[DEPLETION]!,
    left: final.slice(RINGS, RINGS + count),
    trace,
    statistics: { steps, evaluations },
  };
}

/** Where the field turns within a step that it enters growing and leaves falling, or the other way round. */
function turningPoint(step: AcceptedStep): number {
  const apart = 1e-4 * (step.end - step.start);
  const slope = (time: number) => step.interpolate(time + apart, FIELD) - step.interpolate(time - apart, FIELD);
  return (
    rootBetween(slope, step.start, step.end) ??
    (Math.abs(slope(step.end)) < Math.abs(slope(step.start)) ? step.end : step.start)
  );
}

/** `lag`: κ times the lifetime of a lower level that holds just what it is fed, s; `lower`: one that is followed. */
function rateEquations(
  cavity: Cavity,
  count: number,
  seed: number,
  lag: number,
  lower: LowerLevel | undefined,
): RightHandSide {
  const { roundTripTime, photonField, loss } = cavity;
  const { openingTime } = cavity.module.qSwitch;
  const psi = cavity.rings.intensity;
  const perTrip = 1 / roundTripTime;
  const { weight, lifetime } = lower ?? { weight: 0, lifetime: Number.POSITIVE_INFINITY };
  return (time, state, derivative) => {
    const grown = Math.exp(state[FIELD]!);
    const pace = photonField * (grown - seed) * perTrip;
    let gain = 0;
    if (lower === undefined) {
      for (let i = RINGS; i < RINGS + count; i++) {
        const rate = psi[i - RINGS]! * pace;
        const inversion = state[i]! / (1 + lag * rate);
        gain += inversion;
        derivative[i] = -rate * inversion;
      }
    } else {
      for (let i = RINGS; i < RINGS + count; i++) {
        const below = state[i + count]!;
        const inversion = state[i]! - weight * below;
        const rate = psi[i - RINGS]! * inversion * pace;
        gain += inversion;
        derivative[i] = -rate;
        derivative[i + count] = rate - below / lifetime;
      }
    }
    const excess = gain - (time < openingTime ? loss + openingLoss(cavity, time) : loss);
    derivative[FIELD] = (excess + (gain - excess * seed) / grown) * perTrip;
    derivative[DEPLETION] = pace;
  };
}

/** Loss of gain per unit of depletion at the start. */
function depletable(cavity: Cavity, gain: Float64Array): number {
  let sum = 0;
  for (let k = 0; k < gain.length; k++) sum += Math.abs(gain[k]!) * cavity.rings.intensity[k]!;
  return sum;
}

/** G of a state. */
function gainIn(state: Float64Array, count: number, lowerWeight: number): number {
  let gain = 0;
  for (let i = RINGS; i < RINGS + count; i++) gain += state[i]!;
  if (lowerWeight > 0) for (let i = RINGS + count; i < state.length; i++) gain -= lowerWeight * state[i]!;
  return gain;
}

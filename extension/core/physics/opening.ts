import { integrate } from '../numerics/dop853.ts';
import type { Cavity } from './cavity.ts';

/** Part of the ramp left out at its start where the switch blocks wholly: its log loss there is infinite. */
const DARK_START = 1e-3;

/**
 * Extra round-trip log loss while the switch opens: the transmission ramps as a raised cosine over `opening_time` t_o,
 * −ln{1 − closed_loss·(1 + cos(π t/t_o))/2}; 0 afterwards. Time in s from the first instant of opening.
 */
export function openingLoss(cavity: Cavity, time: number): number {
  const { closedLoss = 1, openingTime } = cavity.module.qSwitch;
  if (time >= openingTime) return 0;
  return -Math.log1p((-closedLoss * (1 + Math.cos((Math.PI * time) / openingTime))) / 2);
}

/** First instant, in s, from which the opening is followed. */
export function openingStart(cavity: Cavity): number {
  return cavity.closedLog === Number.POSITIVE_INFINITY ? DARK_START * cavity.module.qSwitch.openingTime : 0;
}

/**
 * Photons in the mode at the ramp's end, the gain not yet depleted: d ln(1 + φ)/dt = [G − loss·φ/(1 + φ)]/t_r.
 * Infinite where that overruns, which a depleted gain would not.
 */
export function photonsAfterOpening(cavity: Cavity, gain: number, photons: number): number {
  const { openingTime } = cavity.module.qSwitch;
  const outcome = integrate(
    (time, state, derivative) => {
      const loss = cavity.loss + openingLoss(cavity, time);
      derivative[0] = (gain + loss * Math.expm1(-state[0]!)) / cavity.roundTripTime;
    },
    openingStart(cavity),
    Float64Array.of(Math.log1p(photons)),
    openingTime,
    { relativeTolerance: 1e-10, absoluteTolerance: 1e-10, maximumSteps: 20_000 },
  );
  return outcome.status === 'reached' ? Math.expm1(outcome.state[0]!) : Number.POSITIVE_INFINITY;
}

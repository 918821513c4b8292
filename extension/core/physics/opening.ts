import { integrate } from '../numerics/dop853.ts';
import { gaussLegendre, quadrature } from '../numerics/gauss-legendre.ts';
import type { Cavity } from './cavity.ts';

/** Part of the ramp left out at its start where the switch blocks wholly: its log loss there is infinite. */
const DARK_START = 1e-3;
/** Before the gain exceeds the falling loss, the field forgets its past: only the last e^−30 of it is followed. */
const FORGOTTEN = 30;
const RULE = gaussLegendre(12);

/**
 * Extra round-trip log loss while the switch opens: the transmission ramps as a raised cosine over `opening_time` t_o,
 * −ln{1 − closed_loss·(1 + cos(π t/t_o))/2}; 0 afterwards. Time in s from the first instant of opening.
 */
export function openingLoss(cavity: Cavity, time: number): number {
  const { closedLoss = 1, openingTime } = cavity.module.qSwitch;
  if (time >= openingTime) return 0;
  return -Math.log1p((-closedLoss * (1 + Math.cos((Math.PI * time) / openingTime))) / 2);
}

/** Where the opening is followed from: s after its first instant, and the photons in the mode by then. */
export interface OpeningStart {
  readonly time: number;
  readonly photons: number;
}

/**
 * While the loss still exceeds the gain by far the field follows it at G/(loss − G), so that part of a long ramp
 * needs no steps. `photons` are those behind the closed switch, G the round-trip log gain.
 */
export function openingStart(cavity: Cavity, gain: number, photons: number): OpeningStart {
  const { closedLoss = 1, openingTime } = cavity.module.qSwitch;
  const earliest = cavity.closedLog === Number.POSITIVE_INFINITY ? DARK_START * openingTime : 0;
  const crossing = (-2 * Math.expm1(cavity.loss - gain)) / closedLoss - 1;
  const even = crossing < 1 ? (openingTime / Math.PI) * Math.acos(Math.max(-1, crossing)) : 0;
  const excess = (time: number) => cavity.loss + openingLoss(cavity, time) - gain;
  const decay = (from: number) => quadrature(RULE, from, even, excess) / cavity.roundTripTime;
  if (!(even > earliest) || decay(earliest) <= FORGOTTEN) return { time: earliest, photons };
  let early = earliest;
  let late = even;
  for (let pass = 0; pass < 40; pass++) {
    const middle = (early + late) / 2;
    if (decay(middle) > FORGOTTEN) early = middle;
    else late = middle;
  }
  return { time: early, photons: gain / excess(early) };
}

/**
 * Photons in the mode at the ramp's end, the gain not yet depleted: d ln(1 + φ)/dt = [G − loss·φ/(1 + φ)]/t_r.
 * Infinite where that overruns, which a depleted gain would not.
 */
export function photonsAfterOpening(cavity: Cavity, gain: number, photons: number): number {
  const start = openingStart(cavity, gain, photons);
  const outcome = integrate(
    (time, state, derivative) => {
      const loss = cavity.loss + openingLoss(cavity, time);
      derivative[0] = (gain + loss * Math.expm1(-state[0]!)) / cavity.roundTripTime;
    },
    start.time,
    Float64Array.of(Math.log1p(start.photons)),
    cavity.module.qSwitch.openingTime,
    { relativeTolerance: 1e-10, absoluteTolerance: 1e-10, maximumSteps: 2000 },
  );
  return outcome.status === 'reached' ? Math.expm1(outcome.state[0]!) : Number.POSITIVE_INFINITY;
}

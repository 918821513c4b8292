import { type Cavity, gainShares, roundTripGain } from './cavity.ts';
import { type Depletion, depletionPulse, timeFromPeak, timeTo } from './depletion.ts';
import { photonsAfterOpening } from './opening.ts';
import type { Waveform } from './prediction.ts';
import { integratePulse, type LowerLevel } from './rate-equations.ts';
import { effectiveStart, photonsBehindSwitch } from './spontaneous-start.ts';
import { drain, type Store } from './store.ts';
import { depletionWaveform, tracedWaveform } from './waveform.ts';

/** One opening of the switch that emitted a giant pulse. SI units. */
export interface Firing {
  readonly model: 'depletion' | 'time_integration';
  readonly energy: number;
  readonly peakPower: number;
  /** Full width at half maximum. */
  readonly width: number;
  /** From the first instant of opening to the peak; absent where the closed switch already lased. */
  readonly buildUp?: number;
  /** x at the pulse's end. */
  readonly depletion: number;
  /** Another pulse follows within the same opening. */
  readonly followed: boolean;
  /** Integration steps that it took. */
  readonly steps: number;
  /** What is left in the medium. */
  readonly after: Store;
  waveform(points: number): Waveform;
}

/** A slow opening counts as over before the pulse where the field at its end is below this part of the peak. */
const NEGLIGIBLE_FIELD = 1e-6;

/**
 * What an opening of the switch emits. Undefined where the gain does not exceed the loss or the pulse does not end
 * (fall to 1 % of its peak) within the gate. Depletion form wherever loss depends on x alone, else time integration.
 */
export function fire(cavity: Cavity, store: Store): Firing | undefined {
  const gain = roundTripGain(cavity, store.ions);
  if (!(gain > cavity.loss)) return undefined;
  const { gate, openingTime } = cavity.module.qSwitch;
  const lower = lowerLevel(cavity);
  const photons = store.overfilled ? 0 : photonsBehindSwitch(cavity, gain);
  if (lower) return integrated(cavity, store, photons, gate, lower);
  const opened = openingTime > 0 ? photonsAfterOpening(cavity, gain, photons) : photons;
  const depletion: Depletion = {
    gain: gainShares(cavity, store.ions),
    intensity: cavity.rings.intensity,
    loss: cavity.loss,
    start: effectiveStart(cavity, gain, opened) * cavity.photonField,
  };
  const pulse = depletionPulse(depletion);
  if (openingTime > 0 && !(pulse && opened * cavity.photonField < NEGLIGIBLE_FIELD * pulse.peak)) {
    return integrated(cavity, store, photons, gate, undefined);
  }
  if (!pulse) return undefined;
  const trip = cavity.roundTripTime;
  const buildUp = openingTime + timeTo(depletion, pulse.peakAt) * trip;
  if (!(buildUp + timeFromPeak(depletion, pulse, 0.01) * trip <= gate)) return undefined;
  return {
    model: 'depletion',
    energy: cavity.energyUnit * cavity.outputLog * pulse.endsAt,
    peakPower: (cavity.energyUnit * cavity.outputLog * pulse.peak) / trip,
    width: pulse.width * trip,
    ...(store.overfilled ? {} : { buildUp }),
    depletion: pulse.endsAt,
    followed: false,
    steps: 0,
    after: drain(cavity, store, (k) => -Math.expm1(-cavity.rings.intensity[k]! * pulse.endsAt)),
    waveform: (points) => depletionWaveform(cavity, depletion, pulse, points),
  };
}

function integrated(
  cavity: Cavity,
  store: Store,
  photons: number,
  gate: number,
  lower: LowerLevel | undefined,
): Firing | undefined {
  const gain = gainShares(cavity, store.ions);
  const pulse = integratePulse(cavity, gain, photons, gate, lower);
  if (!pulse) return undefined;
  const powerOfPhoton = (cavity.photon * cavity.outputLog) / cavity.roundTripTime;
  return {
    model: 'time_integration',
    energy: cavity.energyUnit * cavity.outputLog * pulse.depletion,
    peakPower: powerOfPhoton * pulse.peakPhotons,
    width: pulse.width,
    ...(store.overfilled ? {} : { buildUp: pulse.peakTime }),
    depletion: pulse.depletion,
    followed: pulse.followed,
    steps: pulse.statistics.steps,
    after: drain(cavity, store, (k) => (gain[k] === 0 ? 0 : 1 - pulse.left[k]! / gain[k]!)),
    waveform: (points) => tracedWaveform(pulse, powerOfPhoton, points),
  };
}

/** The lower level's own emptying, where the file gives a lifetime for it. */
function lowerLevel(cavity: Cavity): LowerLevel | undefined {
  const { lowerLevelLifetime, lowerLevelWeight } = cavity.module.medium;
  if (lowerLevelLifetime === undefined || lowerLevelWeight === undefined) return undefined;
  return { weight: lowerLevelWeight, lifetime: lowerLevelLifetime };
}

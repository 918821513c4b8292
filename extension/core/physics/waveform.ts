import type { Cavity } from './cavity.ts';
import { courseAt, type Depletion, type DepletionPulse, smallSignalGain, timesBetween } from './depletion.ts';
import type { Waveform } from './prediction.ts';
import type { IntegratedPulse } from './rate-equations.ts';

/** A waveform from where the power is a thousandth of the peak to where it has fallen back to that, time zero at the peak. */
export function depletionWaveform(
  cavity: Cavity,
  depletion: Depletion,
  pulse: DepletionPulse,
  points: number,
): Waveform {
  const places = timesBetween(depletion, pulse, 1e-3, points);
  const full = smallSignalGain(depletion.gain);
  const perField = (cavity.energyUnit * cavity.outputLog) / cavity.roundTripTime;
  const courses = places.map(({ x }) => courseAt(depletion, x));
  return {
    time_s: places.map(({ time }) => time * cavity.roundTripTime),
    power_W: courses.map(({ field }) => field * perField),
    inversion: courses.map(({ gain }) => gain / full),
  };
}

/** The same from time integration, at most `points` of its samples. */
export function tracedWaveform(pulse: IntegratedPulse, powerOfPhoton: number, points: number): Waveform {
  const { time, field, gain } = pulse.trace.samples();
  const least = Math.log(pulse.peakPhotons * 1e-3);
  const inside = time.map((_, i) => i).filter((i) => field[i]! > least);
  const stride = Math.max(1, Math.ceil(inside.length / points));
  const kept = inside.filter((_, i) => i % stride === 0);
  const full = Math.max(...gain);
  return {
    time_s: kept.map((i) => time[i]! - pulse.peakTime),
    power_W: kept.map((i) => powerOfPhoton * Math.expm1(field[i]!)),
    inversion: kept.map((i) => gain[i]! / full),
  };
}

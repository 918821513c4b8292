import { describe, expect, it } from 'vitest';
import { energyUnitOf, flatModule, lossOf, outcomeOf, pulseOf, pumpedTo, roundTripTimeOf } from './modules.ts';
import { expectOutputs, input, inputList, records } from './published.ts';

/**
 * A module at inversion ratio r whose field starts from `start` (φ₀/n_t). Nothing leaks through the closed switch, so
 * it starts from r/(r − 1) photons, and the mode's area sets what part of n_t they are.
 */
function moduleFrom(r: number, start: number) {
  const loss = lossOf(flatModule());
  const area = (2 * 2.8e-23 * r) / ((r - 1) * start * loss);
  return pumpedTo(r * loss, flatModule({}, Math.sqrt(area / Math.PI)));
}

describe('build-up, through predict', () => {
  it.each(records('build-up-and-hold-off', 'build-up'))('%s', (_, record) => {
    const r = input(record, 'r');
    const buildUp = (start: number) => {
      const module = moduleFrom(r, start);
      return (pulseOf(module).build_up_time_s! * lossOf(module)) / roundTripTimeOf(module);
    };
    const module = moduleFrom(r, 1e-15);
    const peak =
      (pulseOf(module).peak_power_W * roundTripTimeOf(module)) / (energyUnitOf(module) * Math.LN2 * lossOf(module));
    expectOutputs(record, {
      't_peak_over_tauc_phi0=1e-12nt': buildUp(1e-12),
      't_peak_over_tauc_phi0=1e-15nt': buildUp(1e-15),
      't_peak_over_tauc_phi0=1e-18nt': buildUp(1e-18),
      'approx_onset_ln(pk/10phi0)/(r-1)_1e-15': Math.log(peak / 1e-14) / (r - 1),
    });
  });
});

describe('hold-off, through predict', () => {
  const [name, record] = records('build-up-and-hold-off', 'hold-off')[0]!;
  const losses = inputList(record, 'single_pass_modulator_loss');
  const moduleOf = (perPass: number, gain: number) => {
    const resonator = { outputReflectivity: input(record, 'R'), roundTripLoss: -Math.expm1(-input(record, 'L')) };
    return pumpedTo(gain, flatModule({ resonator, qSwitch: { closedLoss: 1 - (1 - perPass) ** 2 } }));
  };

  it(name, () => {
    const limits = losses.map((perPass) => outcomeOf(moduleOf(perPass, 1.5)).holdOffMargin! * 1.5);
    expectOutputs(record, { max_2g0l: limits });
  });

  it.each(losses)('fills up to that limit and no further at %d a pass', (perPass) => {
    const limit = outcomeOf(moduleOf(perPass, 1.5)).holdOffMargin! * 1.5;
    const below = outcomeOf(moduleOf(perPass, 0.999 * limit));
    expect(below.train.unheldGain).toBeUndefined();
    expect(below.figures.state.round_trip_gain_log! / limit).toBeCloseTo(0.999, 9);
    const above = outcomeOf(moduleOf(perPass, 1.3 * limit));
    expect(above.figures.state.round_trip_gain_log! / limit).toBeCloseTo(1, 9);
    expect(above.holdOffMargin).toBeCloseTo(1 / 1.3, 9);
    // The field behind the switch was the laser's own by then: when it began is not known.
    expect(above.figures.pulse!.build_up_time_s).toBeUndefined();
    expect(above.figures.pulse!.energy_J).toBeGreaterThan(below.figures.pulse!.energy_J);
  });
});

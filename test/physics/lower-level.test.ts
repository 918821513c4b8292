import { describe, expect, it } from 'vitest';
import { apart, flatModule, lossOf, moduleWith, outcomeOf, pulseOf, pumpedTo, roundTripTimeOf } from './modules.ts';
import { expectOutputs, input, records } from './published.ts';

const base = flatModule();
const cavityLifetime = roundTripTimeOf(base) / lossOf(base);

function atRatio(r: number, medium: Parameters<typeof moduleWith>[0]['medium'] = {}) {
  return moduleWith({ medium }, pumpedTo(r * lossOf(base), base));
}

describe('a lower level that empties at its own pace, through predict', () => {
  it.each(records('thermalisation', 'lower-level'))('%s', (_, record) => {
    const r = input(record, 'r');
    const fast = pulseOf(atRatio(r));
    const lifetime = input(record, 'tau_l_over_tau_c') * cavityLifetime;
    const pulse = pulseOf(atRatio(r, { lowerLevelLifetime: lifetime, lowerLevelWeight: input(record, 'fl_over_fu') }));
    expectOutputs(record, {
      energy_ratio_to_gamma1: pulse.energy_J / fast.energy_J,
      peak_ratio_to_gamma1: pulse.peak_power_W / fast.peak_power_W,
      FWHM_over_tauc: pulse.width_fwhm_s / cavityLifetime,
    });
  });

  it('that hardly empties is the bottleneck of γ = 1 + f_l/f_u', () => {
    const slow = pulseOf(atRatio(3, { lowerLevelLifetime: 1, lowerLevelWeight: 0.47 }));
    const fixed = pulseOf(atRatio(3, { inversionReductionFactor: 1.47 }));
    expect(apart(slow.energy_J, fixed.energy_J)).toBeLessThan(1e-6);
    expect(apart(slow.peak_power_W, fixed.peak_power_W)).toBeLessThan(1e-6);
    expect(apart(slow.width_fwhm_s, fixed.width_fwhm_s)).toBeLessThan(1e-6);
  });

  // The format sheet's own 200 ps: far shorter than such pulses, so that it hardly shows.
  it.each([
    [0.1, 1.1],
    [0.03, 1.3],
    [0.01, 2],
  ])('of 200 ps takes next to nothing from a long pulse: loss %d, inversion ratio %d', (loss, r) => {
    const resonator = { outputReflectivity: Math.exp(-loss / 2), roundTripLoss: -Math.expm1(-loss / 2) };
    const lossy = pumpedTo(r * loss, flatModule({ resonator }));
    const slowed = moduleWith({ medium: { lowerLevelLifetime: 200e-12, lowerLevelWeight: 0.47 } }, lossy);
    const fast = pulseOf(lossy);
    const { pulse } = outcomeOf(slowed).figures;
    expect(pulse, 'there is a pulse').toBeDefined();
    expect(pulse!.energy_J).toBeLessThan(fast.energy_J);
    expect(pulse!.energy_J / fast.energy_J).toBeGreaterThan(0.99);
    expect(pulse!.width_fwhm_s / fast.width_fwhm_s).toBeCloseTo(1, 1);
  });
});

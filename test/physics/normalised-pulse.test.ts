import { lambertW0 } from 'lambert-w-function';
import { describe, expect, it } from 'vitest';
import { roundTripGain } from '../../extension/core/physics/cavity.ts';
import { apart, energyUnitOf, flatModule, lossOf, outcomeOf, pulseOf, pumpedTo, roundTripTimeOf } from './modules.ts';
import { expectOutputs, input, records } from './published.ts';

const base = flatModule();
const loss = lossOf(base);
const cavityLifetime = roundTripTimeOf(base) / loss;

describe('the normalised pulse, through predict', () => {
  it.each(records('normalised-pulse', 'wagner-lengyel'))('%s', (_, record) => {
    const r = input(record, 'r');
    const { figures, cavity, train } = outcomeOf(pumpedTo(r * loss, base));
    const pulse = figures.pulse!;
    const perField = energyUnitOf(base) * -Math.log(base.resonator.outputReflectivity);
    expectOutputs(record, {
      nf_over_ni: roundTripGain(cavity, train.settled!.after.ions) / figures.state.round_trip_gain_log!,
      energy_extraction_eta: pulse.energy_J / perField / r,
      phi_max_over_nt: (pulse.peak_power_W * cavityLifetime) / perField,
      tp_E_over_P_over_tauc: pulse.width_equivalent_s / cavityLifetime,
      FWHM_over_tauc: pulse.width_fwhm_s / cavityLifetime,
    });
  });

  it.each(records('normalised-pulse', 'qsw-near-threshold'))('%s', (_, record) => {
    const r = 1.0005;
    const width = pulseOf(pumpedTo(r * loss, base)).width_fwhm_s;
    expectOutputs(record, { 'FWHM_times_(r-1)_over_tauc': ((r - 1) * width) / cavityLifetime });
  });

  it.each([1.02, 1.3, 2, 4, 12, 30])('leaves what the Lambert function says at r = %d', (r) => {
    const { train } = outcomeOf(pumpedTo(r * loss, base));
    const left = Math.exp(-train.settled!.depletion);
    expect(apart(left, -lambertW0(-r * Math.exp(-r)) / r)).toBeLessThan(1e-9);
  });
});

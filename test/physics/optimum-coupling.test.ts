import { describe, expect, it } from 'vitest';
import { roundTripGain } from '../../extension/core/physics/cavity.ts';
import { energyUnitOf, flatModule, moduleWith, outcomeOf, pumpedTo, roundTripTimeOf } from './modules.ts';
import { expectOutputs, input, records } from './published.ts';

/** Dissipative log loss L and gain z·L; the coupler in the file is far from the best one. */
function moduleOf(z: number, dissipative: number) {
  return pumpedTo(z * dissipative, flatModule({ resonator: { roundTripLoss: -Math.expm1(-dissipative) } }));
}

describe('optimum coupling, through predict', () => {
  it.each(records('optimum-coupling', 'degnan-Ropt'))('%s', (_, record) => {
    const { coupling } = outcomeOf(moduleOf(input(record, 'z'), input(record, 'L'))).figures;
    expectOutputs(record, { Ropt: coupling.optimum_reflectivity! });
  });

  it.each(records('optimum-coupling', 'degnan-opt'))('%s', (_, record) => {
    const dissipative = 0.06;
    const module = moduleOf(input(record, 'z'), dissipative);
    const best = outcomeOf(module).figures.coupling;
    const rebuilt = moduleWith({ resonator: { outputReflectivity: best.optimum_reflectivity! } }, module);
    const { figures, cavity, train } = outcomeOf(rebuilt);
    const { pulse, state } = figures;
    const unit = energyUnitOf(module) * dissipative;
    const trip = roundTripTimeOf(module);
    expectOutputs(record, {
      nt_over_ni_a: 1 / state.inversion_ratio!,
      r_ni_over_nt: state.inversion_ratio!,
      ln_1_over_Ropt_per_L: -Math.log(best.optimum_reflectivity!) / dissipative,
      E_times_2sigma_gamma_over_A_hnu_L: best.optimum_energy_J! / unit,
      extraction_efficiency: state.extraction_efficiency!,
      tp_times_L_over_tr: (pulse!.width_equivalent_s * dissipative) / trip,
      Ppk_norm: (pulse!.peak_power_W * trip) / (unit * dissipative),
      ni_over_nf: state.round_trip_gain_log! / roundTripGain(cavity, train.settled!.after.ions),
    });
    expect(Math.abs(pulse!.energy_J / best.optimum_energy_J! - 1)).toBeLessThan(1e-9);
  });
});

import { describe, it } from 'vitest';
import { roundTripGain } from '../../extension/core/physics/cavity.ts';
import { c, flatModule, h, lossOf, outcomeOf, pumpedTo, roundTripTimeOf } from './modules.ts';
import { expectOutputs, input, records } from './published.ts';

const lifetime = 230e-6;

describe('a continuous pump, openings in balance with it, through predict', () => {
  it.each(records('repetitive'))('%s', (_, record) => {
    const rate = input(record, 'f_times_tau') / lifetime;
    const ceiling = input(record, 'r_inf=n_inf/n_t');
    const base = flatModule({
      medium: { upperLevelLifetime: lifetime },
      pump: { kind: 'continuous' },
      qSwitch: { repetitionRate: rate, gate: 0.5 / rate, opensAt: 1 / rate },
    });
    const loss = lossOf(base);
    const module = pumpedTo(ceiling * loss, base);
    const { figures, cavity, train } = outcomeOf(module);
    const pulse = figures.pulse!;
    // Continuous emission: every upper-level ion above threshold, less what else the resonator loses.
    const { power, absorbedFraction, quantumEfficiency, wavelength } = module.pump;
    const ions = (power * absorbedFraction * quantumEfficiency * wavelength) / (h * c);
    const useful = -Math.log(module.resonator.outputReflectivity) / loss;
    const continuous = ((h * c) / module.medium.wavelength) * ions * (1 - 1 / ceiling) * useful;
    expectOutputs(record, {
      ni_over_nt: figures.state.inversion_ratio!,
      nf_over_nt: roundTripGain(cavity, train.settled!.after.ions) / loss,
      E_over_E_single: pulse.energy_J / figures.train.pulse_after_pause_energy_J!,
      Pavg_over_Pcw: figures.train.average_power_W! / continuous,
      Ppk_over_Ppk_single: pulse.peak_power_W / train.afterPause!.peakPower,
      tp_E_over_P_over_tauc: (pulse.width_equivalent_s * loss) / roundTripTimeOf(module),
    });
  });
});

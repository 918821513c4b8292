import { describe, it } from 'vitest';
import { energyUnitOf, flatModule, moduleWith, pulseOf, pumpedTo, roundTripTimeOf } from './modules.ts';
import { expectOutputs, records } from './published.ts';

const gain = 1.2;
/** No dissipative loss: the whole loss is the output coupling. */
const base = pumpedTo(gain, flatModule({ resonator: { roundTripLoss: 0 } }));
const trip = roundTripTimeOf(base);

function pulseAt(coupling: number) {
  return pulseOf(moduleWith({ resonator: { outputReflectivity: Math.exp(-coupling * gain) } }, base));
}

/** Place of the greatest value between two ends, by golden section. */
function best(value: (x: number) => number, from: number, to: number): number {
  const share = (Math.sqrt(5) - 1) / 2;
  let low = from;
  let high = to;
  while (high - low > 1e-7) {
    const left = high - share * (high - low);
    const right = low + share * (high - low);
    if (value(left) > value(right)) high = right;
    else low = left;
  }
  return (low + high) / 2;
}

describe('the shortest pulse and the highest peak, through predict', () => {
  it.each(records('minimum-width', 'zayhowski'))('%s', (_, record) => {
    const coupling = best((x) => -pulseAt(x).width_fwhm_s, 0.1, 0.8);
    expectOutputs(record, {
      FWHM_min_times_lnG_over_trt: (pulseAt(coupling).width_fwhm_s * gain) / trip,
      output_coupling_over_lnG: coupling,
    });
  });

  it.each(records('minimum-width', 'max-peak'))('%s', (_, record) => {
    const coupling = best((x) => pulseAt(x).peak_power_W, 0.1, 0.8);
    expectOutputs(record, {
      r_at_max_peak_power: 1 / coupling,
      coupling_over_lnG: coupling,
      '(r-1-ln r)/r^2': (pulseAt(coupling).peak_power_W * trip) / (energyUnitOf(base) * gain ** 2),
    });
  });
});

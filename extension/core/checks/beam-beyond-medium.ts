import type { Beam } from '../physics/gain-module.ts';
import { pumpWithin } from '../physics/rings.ts';
import { formatPercent, formatQuantity } from '../quantity/format.ts';
import type { Check, Finding } from './check.ts';

const ALLOWED_OUTSIDE = 0.01;

/** More than 1 % of a beam lies outside the medium's diameter, which the model does not cut off. */
export const beamBeyondMedium: Check = {
  code: 'beam-beyond-medium',
  title: 'A beam is wider than the medium',
  run({ module: { medium, pump, resonator } }) {
    const { diameter } = medium;
    if (diameter === undefined) return [];
    const outside = (beam: Beam, path: string, what: string): Finding[] => {
      const lost = 1 - pumpWithin(beam, diameter / 2);
      if (lost <= ALLOWED_OUTSIDE) return [];
      const message = `${formatPercent(lost, 2)} of the ${what} lies outside the medium (${formatQuantity(diameter, 'length')} across). The model clips nothing, so the figures are too good. Narrow the beam, or count the clipped part as loss.`;
      return [{ severity: 'warning', message, path }];
    };
    return [
      ...outside(pump.beam, 'pump.beam.radius', 'pump'),
      ...outside(resonator.beam, 'resonator.beam.radius', 'laser mode'),
    ];
  },
};

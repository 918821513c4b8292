import { SCALED_RANGE, SHORTEST_SCALED, WAVELENGTH_MISMATCH } from '../physics/damage.ts';
import type { Surface } from '../physics/gain-module.ts';
import { formatQuantity, formatWavelength } from '../quantity/format.ts';
import type { Check, Finding } from './check.ts';

/** A threshold measured under conditions too far from this pulse: another wavelength, or far shorter or longer pulses. */
export const thresholdConditions: Check = {
  code: 'threshold-conditions',
  title: 'A damage threshold was measured under other conditions',
  run({ module, outcome }) {
    const width = outcome.figures.pulse?.width_fwhm_s;
    return module.surfaces.flatMap((surface) => [
      ...otherWavelength(surface, module.medium.wavelength),
      ...(width === undefined ? [] : otherWidth(surface, width)),
    ]);
  },
};

function otherWavelength({ threshold, path }: Surface, wavelength: number): Finding[] {
  if (Math.abs(threshold.wavelength / wavelength - 1) <= WAVELENGTH_MISMATCH) return [];
  const at = formatWavelength(threshold.wavelength);
  return [
    {
      severity: 'warning',
      message: `The threshold was measured at ${at}, the laser runs at ${formatWavelength(wavelength)}. Thresholds are not scaled across wavelengths, so this margin is a hint only: ask for one at the laser's own.`,
      path: `${path}.damage_threshold.wavelength`,
    },
  ];
}

function otherWidth({ threshold, path }: Surface, width: number): Finding[] {
  const shortest = Math.min(threshold.pulseWidth, width);
  const longest = Math.max(threshold.pulseWidth, width);
  const where = `${path}.damage_threshold.pulse_width`;
  if (shortest < SHORTEST_SCALED) {
    return [
      {
        severity: 'warning',
        message: `No margin: the threshold is for ${formatQuantity(threshold.pulseWidth, 'time')}, the pulse lasts ${formatQuantity(width, 'time')}. Below 20 ps damage follows other laws, and nothing is scaled.`,
        path: where,
      },
    ];
  }
  if (shortest >= SCALED_RANGE[0] && longest <= SCALED_RANGE[1]) return [];
  return [
    {
      severity: 'information',
      message: `The threshold is scaled from ${formatQuantity(threshold.pulseWidth, 'time')} to ${formatQuantity(width, 'time')}. Outside 50 ps to 100 ns that is an extrapolation: take the margin as rough.`,
      path: where,
    },
  ];
}

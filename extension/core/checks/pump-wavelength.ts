import { formatWavelength } from '../quantity/format.ts';
import type { Check } from './check.ts';

/** A pump photon with less energy than a laser photon. */
export const pumpWavelength: Check = {
  code: 'pump-wavelength',
  title: 'The pump photon carries too little energy',
  run: ({ module: { pump, medium } }) =>
    pump.wavelength < medium.wavelength
      ? []
      : [
          {
            severity: 'error',
            message: `The pump wavelength (${formatWavelength(pump.wavelength)}) must be shorter than the laser's (${formatWavelength(medium.wavelength)}): a pump photon has to carry more energy than a laser photon.`,
            path: 'pump.wavelength',
          },
        ],
};

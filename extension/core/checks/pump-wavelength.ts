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
            message:
              'A pump photon must carry more energy than a laser photon: the pump wavelength has to be the shorter one.',
            path: 'pump.wavelength',
          },
        ],
};

import type { Check } from './check.ts';

/** More ions excited than there are. */
export const tooManyExcited: Check = {
  code: 'too-many-excited',
  title: 'More ions are excited than there are',
  run({ module: { medium }, outcome: { train, cavity } }) {
    if (medium.ionDensity === undefined) return [];
    const available = medium.ionDensity * medium.length;
    const onAxis = Math.max(...train.store.ions);
    if (onAxis <= available) return [];
    return [
      {
        severity: 'error',
        message: `On axis the pump would excite ${(onAxis / available).toPrecision(3)} times the ions that the medium holds along its length. Absorption bleaches long before: lower the pump, widen its beam, or correct the ion density.`,
        path: cavity.module.pump.power > 0 ? 'pump.beam.radius' : 'gain_medium.ion_density',
      },
    ];
  },
};

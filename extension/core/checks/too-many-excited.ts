import type { Check } from './check.ts';

/** More ions excited than there are. */
export const tooManyExcited: Check = {
  code: 'too-many-excited',
  title: 'More ions are excited than there are',
  impossible: true,
  run({ module: { medium }, outcome: { train } }) {
    if (medium.ionDensity === undefined) return [];
    const available = medium.ionDensity * medium.length;
    const most = Math.max(...train.store.ions);
    if (most <= available) return [];
    return [
      {
        severity: 'error',
        message: `In the laser mode the pump would excite up to ${(most / available).toPrecision(3)} times the ions that the medium has. Real absorption bleaches before that: widen the pump beam, lower the pump, or correct \`ion_density\`.`,
        path: 'pump.beam.radius',
      },
    ];
  },
};

import type { Check } from './check.ts';

/** A resonator that loses nothing but what it emits. */
export const noDissipativeLoss: Check = {
  code: 'no-dissipative-loss',
  title: 'The resonator is said to lose nothing',
  run: ({ module: { resonator } }) =>
    resonator.roundTripLoss > 0
      ? []
      : [
          {
            severity: 'warning',
            message:
              'No real resonator is free of loss. With none there is no optimum output reflectivity (it tends to 100 %), and the energy predicted is the most that can be. Give the measured round-trip loss.',
            path: 'resonator.round_trip_loss',
          },
        ],
};

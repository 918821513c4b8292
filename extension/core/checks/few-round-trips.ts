import type { Check } from './check.ts';

/** Common practice, no source: the rate equations average over a round trip, which needs several of them in a pulse. */
const FEWEST_ROUND_TRIPS = 4;

/** A pulse that lasts only a few round trips. */
export const fewRoundTrips: Check = {
  code: 'few-round-trips',
  title: 'The pulse lasts only a few round trips',
  run({ outcome: { figures, cavity } }) {
    const trips = (figures.pulse?.width_fwhm_s ?? Number.POSITIVE_INFINITY) / cavity.roundTripTime;
    if (trips >= FEWEST_ROUND_TRIPS) return [];
    return [
      {
        severity: 'information',
        message: `The pulse lasts only ${trips.toPrecision(2)} round trips (full width at half maximum). The model averages over a round trip: take width and peak power as rough.`,
        path: 'resonator.length',
      },
    ];
  },
};

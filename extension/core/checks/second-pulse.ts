import type { Check } from './check.ts';

/** The switch opens so slowly that one opening gives more than one pulse. */
export const secondPulse: Check = {
  code: 'second-pulse',
  title: 'A second pulse follows in the same opening',
  run: ({ outcome: { train } }) =>
    train.settled?.followed
      ? [
          {
            severity: 'warning',
            message:
              'The loss still falls after the first pulse, so another one follows in the same opening. The figures are those of the first pulse alone. Open the switch faster, or lower the gain.',
            path: 'q_switch.opening_time',
          },
        ]
      : [],
};

import { formatQuantity } from '../quantity/format.ts';
import type { Check } from './check.ts';

/** A medium longer than the space between the mirrors. */
export const mediumTooLong: Check = {
  code: 'medium-too-long',
  title: 'The medium is longer than the resonator',
  impossible: true,
  run: ({ module: { medium, resonator } }) =>
    medium.length <= resonator.length
      ? []
      : [
          {
            severity: 'error',
            message: `The medium (${formatQuantity(medium.length, 'length')}) is longer than the resonator (${formatQuantity(resonator.length, 'length')}, mirror to mirror).`,
            path: 'resonator.length',
          },
        ],
};

import { formatQuantity } from '../quantity/format.ts';
import type { Check } from './check.ts';

/** Openings that fail or pulses that alternate instead of repeating. */
export const trainUnsettled: Check = {
  code: 'train-unsettled',
  title: 'The train does not settle',
  run: ({ outcome: { train } }) =>
    train.unsettled
      ? [
          {
            severity: 'warning',
            message: `Pulses do not repeat at this rate: openings fail, or energies alternate. The figures are those of the largest pulse; the mean is ${formatQuantity(train.meanEnergy, 'energy')} per opening. Lower the repetition rate, raise the pump, or lengthen the gate.`,
            path: 'q_switch.repetition_rate',
          },
        ]
      : [],
};

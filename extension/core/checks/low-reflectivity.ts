import { formatPercent } from '../quantity/format.ts';
import type { Check } from './check.ts';

/** Common practice, no source: below this the uniform-loss convention (Degnan, IEEE J. Quantum Electron. 25, 214 (1989)) drifts from reality. */
const LOWEST_REFLECTIVITY = 0.3;

/** A coupler so open that gain and field vary along the resonator. */
export const lowReflectivity: Check = {
  code: 'low-reflectivity',
  title: 'The output reflectivity is low for the uniform-loss model',
  run: ({ module: { resonator } }) =>
    resonator.outputReflectivity >= LOWEST_REFLECTIVITY
      ? []
      : [
          {
            severity: 'information',
            message: `The output reflectivity is ${formatPercent(resonator.outputReflectivity, 2)}. The model spreads the output loss evenly along the resonator, and below about 30 % its energy and width drift from the real ones.`,
            path: 'resonator.output_reflectivity',
          },
        ],
};

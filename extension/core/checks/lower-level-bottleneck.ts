import { findLine, findMedium } from '../physics/materials.ts';
import { formatQuantity } from '../quantity/format.ts';
import type { Check } from './check.ts';

/** Ratio of lower-level lifetime to photon lifetime from which energy falls by about 1 % (at 0.1 by 0.6 %, own two-manifold integration). Source: Degnan, Coyle & Kay, IEEE J. Quantum Electron. 34, 887 (1998). */
const MATTERS_FROM = 0.15;

/** The table knows a lower-level lifetime that is not short against the photon lifetime, and the file leaves it out. */
export const lowerLevelBottleneck: Check = {
  code: 'lower-level-bottleneck',
  title: 'The lower level may not empty fast enough',
  run({ design, module: { medium }, outcome: { cavity } }) {
    const section = design.values.gain_medium;
    if (section?.material === undefined || medium.lowerLevelLifetime !== undefined) return [];
    if (medium.inversionReductionFactor !== 1 || medium.absorptionCrossSection > 0) return [];
    const row = findMedium(section.material);
    const lifetime = row && findLine(row, medium.wavelength)?.figures.lower_level_lifetime;
    const photonLifetime = cavity.roundTripTime / cavity.loss;
    if (!lifetime || lifetime.value < MATTERS_FROM * photonLifetime) return [];
    return [
      {
        severity: 'information',
        message: `The lower level lives about ${formatQuantity(lifetime.value, 'time', 2)} (${lifetime.source}), a photon in the resonator ${formatQuantity(photonLifetime, 'time', 2)}: it may not empty within the pulse, which costs energy. Give \`lower_level_lifetime\` to have it counted.`,
        path: 'gain_medium.material',
      },
    ];
  },
};

import { gaussLegendre } from '../../extension/core/numerics/gauss-legendre.ts';
import { type Cavity, cavityOf, gainShares, roundTripGain } from '../../extension/core/physics/cavity.ts';
import { type Depletion, type DepletionPulse, depletionPulse } from '../../extension/core/physics/depletion.ts';
import type { Rings } from '../../extension/core/physics/rings.ts';
import { effectiveStart } from '../../extension/core/physics/spontaneous-start.ts';
import { coldStore, flatModule, lossOf, moduleWith, pumpedTo } from '../physics/modules.ts';

/** One pulse in both forms, about three times above threshold, the switch opened at once. */
export interface Case {
  readonly name: string;
  readonly cavity: Cavity;
  readonly depletion: Depletion;
  /** What the solvers' errors are measured against. */
  readonly pulse: DepletionPulse;
}

export function oneRing(): Case {
  const flat = flatModule();
  return caseOf('one ring', cavityOf(pumpedTo(3 * lossOf(flat), flat)));
}

/** Flat pump under a Gaussian mode, on the product's own 20 rings. */
export function gaussian(): Case {
  return caseOf('20 rings', cavityOf(GAUSSIAN));
}

/** The same on 16 rings, for a solver that takes longer the more there are. */
export function gaussianOnSixteen(): Case {
  const cavity = cavityOf(GAUSSIAN);
  const { pump, resonator } = GAUSSIAN;
  const edge = Math.exp(-2 * (pump.beam.radius / resonator.beam.radius) ** 2);
  const rule = gaussLegendre(16);
  const low = edge ** (1 / 4);
  const place = rule.nodes.map((node) => low + ((1 - low) / 2) * (1 + node));
  const rings: Rings = {
    ...cavity.rings,
    intensity: place.map((v) => v ** 4),
    weight: place.map((v, i) => rule.weights[i]! * (1 - low) * 2 * v ** 3),
    pump: place.map(() => cavity.rings.pump[0]!),
  };
  return caseOf('16 rings', { ...cavity, rings });
}

const GAUSSIAN = moduleWith({ pump: { power: 840 } });

function caseOf(name: string, cavity: Cavity): Case {
  const { ions } = coldStore(cavity);
  const start = effectiveStart(cavity, roundTripGain(cavity, ions), 0) * cavity.photonField;
  const gain = gainShares(cavity, ions);
  const depletion = { gain, intensity: cavity.rings.intensity, loss: cavity.loss, start };
  const pulse = depletionPulse(depletion);
  if (!pulse) throw new Error(`${name}: no pulse`);
  return { name, cavity, depletion, pulse };
}

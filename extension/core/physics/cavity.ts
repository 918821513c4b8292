import { photonEnergy, SPEED_OF_LIGHT } from './constants.ts';
import type { GainModule } from './gain-module.ts';
import { type Rings, ringsFor } from './rings.ts';

/** The quantities that every model of one module shares. Conventions: `docs/model.md`. */
export interface Cavity {
  readonly module: GainModule;
  readonly rings: Rings;
  /** t_r in s. */
  readonly roundTripTime: number;
  /** ln(1/R): what leaves through the output coupler. */
  readonly outputLog: number;
  /** −ln(1 − round_trip_loss): what is lost otherwise. */
  readonly dissipativeLog: number;
  /** δ, their sum. */
  readonly loss: number;
  /** What the closed switch adds; infinite where the file gives no closed loss. */
  readonly closedLog: number;
  /** σ = σ_e + σ_a, m². */
  readonly crossSection: number;
  /** γ. */
  readonly reduction: number;
  /** Inversion of unpumped ions, −N_0 l σ_a/(σ_e + σ_a) with its sign turned, m⁻². */
  readonly ground: number;
  /** hν in J. */
  readonly photon: number;
  /** Upper-level ions per second while the pump is on. */
  readonly pumpRate: number;
  /** J per unit of depletion x in the medium: hνA/(2γσ). */
  readonly energyUnit: number;
  /** Field (unit hν/(2γσ t_r)) of one photon in the mode. */
  readonly photonField: number;
}

/** Works out what the module's models share. Every figure of the module must be finite and in its valid range. */
export function cavityOf(module: GainModule): Cavity {
  const { medium, pump, resonator, qSwitch } = module;
  const crossSection = medium.emissionCrossSection + medium.absorptionCrossSection;
  const reabsorbing = medium.absorptionCrossSection > 0;
  const rings = ringsFor(resonator.beam, pump.beam, reabsorbing);
  const reduction = medium.inversionReductionFactor;
  const outputLog = -Math.log(resonator.outputReflectivity);
  const dissipativeLog = -Math.log1p(-resonator.roundTripLoss);
  const photon = photonEnergy(medium.wavelength);
  const opticalPath = resonator.length + (medium.groupIndex - 1) * medium.length + qSwitch.extraOpticalPath;
  return {
    module,
    rings,
    roundTripTime: (2 * opticalPath) / SPEED_OF_LIGHT,
    outputLog,
    dissipativeLog,
    loss: outputLog + dissipativeLog,
    closedLog: qSwitch.closedLoss === undefined ? Number.POSITIVE_INFINITY : -Math.log1p(-qSwitch.closedLoss),
    crossSection,
    reduction,
    ground: reabsorbing ? ((medium.ionDensity ?? 0) * medium.length * medium.absorptionCrossSection) / crossSection : 0,
    photon,
    pumpRate: (pump.power * pump.absorbedFraction * pump.quantumEfficiency) / photonEnergy(pump.wavelength),
    energyUnit: (photon * rings.modeArea) / (2 * reduction * crossSection),
    photonField: (2 * reduction * crossSection) / rings.modeArea,
  };
}

/** Each ring's share of the round-trip log gain, from upper-level ions per m². */
export function gainShares(cavity: Cavity, ions: Float64Array): Float64Array {
  const { crossSection, ground, rings } = cavity;
  return ions.map((n, k) => 2 * crossSection * rings.weight[k]! * (n - ground));
}

/** G: round-trip log gain. */
export function roundTripGain(cavity: Cavity, ions: Float64Array): number {
  const { crossSection, ground, rings } = cavity;
  let sum = 0;
  for (let k = 0; k < ions.length; k++) sum += rings.weight[k]! * (ions[k]! - ground);
  return 2 * crossSection * sum;
}

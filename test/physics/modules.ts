import { type Cavity, cavityOf } from '../../extension/core/physics/cavity.ts';
import type { GainModule } from '../../extension/core/physics/gain-module.ts';
import { type Outcome, predict } from '../../extension/core/physics/predict.ts';
import type { PulseFigures } from '../../extension/core/physics/prediction.ts';
import { emptyStore, refill, type Store, scheduleOf } from '../../extension/core/physics/store.ts';

/** Constants typed afresh: the tests share none with the product. */
export const h = 6.62607015e-34;
export const c = 299792458;

type Section = 'medium' | 'pump' | 'resonator' | 'qSwitch';
export type Changes = { readonly [S in Section]?: Partial<GainModule[S]> };

/** The format sheet's module, without surfaces, and without a closed loss so that nothing lases early. */
const SHEET: GainModule = {
  medium: {
    wavelength: 1064e-9,
    length: 0.06,
    emissionCrossSection: 2.8e-23,
    absorptionCrossSection: 0,
    upperLevelLifetime: 230e-6,
    inversionReductionFactor: 1,
    refractiveIndex: 1.82,
    groupIndex: 1.835,
  },
  pump: {
    kind: 'pulsed',
    wavelength: 808e-9,
    power: 600,
    duration: 200e-6,
    absorbedFraction: 0.85,
    quantumEfficiency: 0.95,
    beam: { profile: 'flat', radius: 1.7e-3 },
  },
  resonator: {
    length: 0.18,
    outputReflectivity: 0.5,
    roundTripLoss: 0.06,
    beam: { profile: 'gaussian', radius: 0.9e-3 },
  },
  qSwitch: {
    kind: 'electro_optic',
    openingTime: 0,
    opensAt: 200e-6,
    gate: 1e-3,
    repetitionRate: 20,
    extraOpticalPath: 0,
  },
  surfaces: [],
};

export function moduleWith(changes: Changes, base: GainModule = SHEET): GainModule {
  return {
    medium: { ...base.medium, ...changes.medium },
    pump: { ...base.pump, ...changes.pump },
    resonator: { ...base.resonator, ...changes.resonator },
    qSwitch: { ...base.qSwitch, ...changes.qSwitch },
    surfaces: [],
  };
}

/** Pump and mode filling one flat disc: one inversion, for which the closed forms hold. */
export function flatModule(changes: Changes = {}, radius = 1e-3): GainModule {
  const beam = { profile: 'flat', radius } as const;
  return moduleWith({ ...changes, pump: { ...changes.pump, beam }, resonator: { ...changes.resonator, beam } });
}

/** −ln R − ln(1 − loss). */
export function lossOf({ resonator }: GainModule): number {
  return -Math.log(resonator.outputReflectivity) - Math.log(1 - resonator.roundTripLoss);
}

export function roundTripTimeOf({ resonator, medium }: GainModule): number {
  return (2 * (resonator.length + (medium.groupIndex - 1) * medium.length)) / c;
}

/** hνA/(2γσ) in J. */
export function energyUnitOf({ medium, resonator }: GainModule): number {
  const { radius, profile } = resonator.beam;
  const area = Math.PI * radius ** 2 * (profile === 'flat' ? 1 : 0.5);
  const crossSection = medium.emissionCrossSection + medium.absorptionCrossSection;
  return (((h * c) / medium.wavelength) * area) / (2 * medium.inversionReductionFactor * crossSection);
}

/** The same module with the pump power that gives a round-trip log gain of `gain`; flat disc, four levels only. */
export function pumpedTo(gain: number, module: GainModule): GainModule {
  const { medium, pump, resonator } = module;
  const lifetime = medium.upperLevelLifetime;
  const area = Math.PI * resonator.beam.radius ** 2;
  const storage = pump.kind === 'continuous' ? lifetime : lifetime * (1 - Math.exp(-(pump.duration ?? 0) / lifetime));
  const rate = (gain * area) / (2 * medium.emissionCrossSection * storage);
  const power = (rate * h * c) / (pump.wavelength * pump.absorbedFraction * pump.quantumEfficiency);
  return moduleWith({ pump: { power } }, module);
}

export function outcomeOf(module: GainModule): Outcome {
  const outcome = predict(module, []);
  if (!outcome) throw new Error('an actively switched module has an outcome');
  return outcome;
}

export function pulseOf(module: GainModule): PulseFigures {
  const { pulse } = outcomeOf(module).figures;
  if (!pulse) throw new Error('no pulse');
  return pulse;
}

/** The store at the first opening after a cold start. */
export function coldStore(cavity: Cavity): Store {
  return refill(cavity, emptyStore(cavity), { ...scheduleOf(cavity), idle: 0 });
}

export function cavityAndStore(module: GainModule): { cavity: Cavity; store: Store } {
  const cavity = cavityOf(module);
  return { cavity, store: coldStore(cavity) };
}

/** Relative distance of two figures. */
export function apart(a: number, b: number): number {
  return Math.abs(a - b) / Math.max(Math.abs(a), Math.abs(b));
}

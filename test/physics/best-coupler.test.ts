import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { GainModule } from '../../extension/core/physics/gain-module.ts';
import { designs, withoutHoldOff } from './designs.ts';
import { apart, type Changes, energyUnitOf, flatModule, moduleWith, outcomeOf, pumpedTo } from './modules.ts';

function coupledBy(module: GainModule, outputReflectivity: number): GainModule {
  return moduleWith({ resonator: { outputReflectivity } }, module);
}

function energyAt(module: GainModule, reflectivity: number): number {
  return outcomeOf(coupledBy(module, reflectivity)).figures.pulse?.energy_J ?? 0;
}

const gaussian = { profile: 'gaussian', radius: 0.8e-3 } as const;
const flat = { profile: 'flat', radius: 0.8e-3 } as const;
const continuous: Changes = {
  pump: { kind: 'continuous', power: 200 },
  resonator: { outputReflectivity: 0.9, roundTripLoss: 0.04, beam: gaussian },
  qSwitch: { repetitionRate: 6000, opensAt: 1 / 6000, gate: 80e-6 },
};
const pulsed: Changes = { resonator: { roundTripLoss: 0.08, beam: gaussian } };
const cases: [string, Changes][] = [
  ['pulsed, flat under Gaussian', pulsed],
  ['pulsed, Gaussian under Gaussian', { ...pulsed, pump: { beam: gaussian, power: 250 } }],
  [
    'pulsed, flat under flat',
    { ...pulsed, pump: { beam: flat, power: 250 }, resonator: { roundTripLoss: 0.08, beam: flat } },
  ],
  ['pulsed, with reabsorption', { ...pulsed, medium: { absorptionCrossSection: 2e-26, ionDensity: 1e26 } }],
  ['pulsed, opening slowly', { ...pulsed, qSwitch: { openingTime: 150e-9, closedLoss: 0.995 } }],
  ['continuous, flat under Gaussian', continuous],
  ['continuous, Gaussian under Gaussian', { ...continuous, pump: { ...continuous.pump, beam: gaussian, power: 60 } }],
  [
    'continuous, flat under flat',
    {
      ...continuous,
      pump: { ...continuous.pump, beam: flat, power: 60 },
      resonator: { ...continuous.resonator, beam: flat },
    },
  ],
  ['continuous, at a high rate', { ...continuous, qSwitch: { repetitionRate: 20e3, opensAt: 5e-5, gate: 25e-6 } }],
];

describe('the best output reflectivity', () => {
  it.each(cases)('gives the energy that is promised, and its neighbours less: %s', (_, changes) => {
    const module = moduleWith(changes);
    const { optimum_reflectivity, optimum_energy_J } = outcomeOf(module).figures.coupling;
    const best = energyAt(module, optimum_reflectivity!);
    expect(apart(best, optimum_energy_J!)).toBeLessThan(1e-6);
    expect(best).toBeGreaterThanOrEqual(outcomeOf(module).figures.pulse!.energy_J);
    expect(energyAt(module, 0.995 * optimum_reflectivity!)).toBeLessThan(best);
    expect(energyAt(module, 1.005 * optimum_reflectivity!)).toBeLessThan(best);
  });

  it.each(cases)('does not depend on the one in the file: %s', (_, changes) => {
    const module = moduleWith(changes);
    const here = outcomeOf(module).figures.coupling;
    const there = outcomeOf(coupledBy(module, 0.8)).figures.coupling;
    expect(apart(here.optimum_reflectivity!, there.optimum_reflectivity!)).toBeLessThan(2e-5);
    expect(apart(here.optimum_energy_J!, there.optimum_energy_J!)).toBeLessThan(1e-6);
  });

  it('is a maximum over the whole design space', () => {
    fc.assert(
      fc.property(designs.map(withoutHoldOff), (module) => {
        const { optimum_reflectivity, optimum_energy_J } = outcomeOf(module).figures.coupling;
        const best = energyAt(module, optimum_reflectivity!);
        expect(apart(best, optimum_energy_J!)).toBeLessThan(1e-6);
        for (const factor of [0.96, 1.04]) {
          expect(energyAt(module, optimum_reflectivity! ** factor)).toBeLessThan(best);
        }
      }),
      { numRuns: 300, seed: 8 },
    );
  });

  // Source: J. J. Degnan, IEEE J. Quantum Electron. 25, 214 (1989).
  it('is the closed form for flat profiles', () => {
    const double = (min: number, max: number) => fc.double({ min, max, noNaN: true });
    fc.assert(
      fc.property(double(1.1, 200), double(0.001, 0.8), double(1, 2), (z, lost, reduction) => {
        const dissipative = -Math.log(1 - lost);
        const medium = { inversionReductionFactor: reduction };
        const module = pumpedTo(z * dissipative, flatModule({ medium, resonator: { roundTripLoss: lost } }));
        const { coupling } = outcomeOf(module).figures;
        const wanted = (dissipative * (z - 1 - Math.log(z))) / Math.log(z);
        expect(apart(-Math.log(coupling.optimum_reflectivity!), wanted)).toBeLessThan(1e-6);
        const energy = energyUnitOf(module) * dissipative * (z - 1 - Math.log(z));
        expect(apart(coupling.optimum_energy_J!, energy)).toBeLessThan(1e-6);
      }),
      { numRuns: 300, seed: 9 },
    );
  });

  it('does not exist without dissipative loss, nor where no coupler gives a pulse', () => {
    expect(outcomeOf(moduleWith({ resonator: { roundTripLoss: 0 } })).figures.coupling).toEqual({});
    expect(outcomeOf(moduleWith({ pump: { power: 0 } })).figures.coupling).toEqual({});
    const lossy = moduleWith({ resonator: { roundTripLoss: 0.9, beam: gaussian } });
    expect(outcomeOf(lossy).figures.coupling).toEqual({});
  });
});

import { lambertW0 } from 'lambert-w-function';
import { describe, expect, it } from 'vitest';
import { bruteTrain } from './brute-force.ts';
import { apart, type Changes, c, flatModule, h, lossOf, moduleWith, outcomeOf, pumpedTo } from './modules.ts';

function expectSame(changes: Changes, openings: number) {
  const module = moduleWith(changes);
  const { figures, train } = outcomeOf(module);
  const brute = bruteTrain(module, openings);
  expect(train.unsettled).toBe(false);
  expect(apart(figures.pulse!.energy_J, brute.energy)).toBeLessThan(1e-6);
  expect(apart(figures.state.round_trip_gain_log!, brute.gain)).toBeLessThan(1e-6);
  expect(apart(figures.state.stored_energy_J!, (brute.ions * h * c) / module.medium.wavelength)).toBeLessThan(1e-6);
  expect(apart(figures.train.average_power_W!, brute.energy * module.qSwitch.repetitionRate)).toBeLessThan(1e-6);
  expect(apart(figures.train.first_pulse_energy_J!, brute.first!)).toBeLessThan(1e-6);
  return { figures, brute };
}

const flat = { profile: 'flat', radius: 0.4e-3 } as const;
const gaussian = { profile: 'gaussian', radius: 0.35e-3 } as const;
/** Erbium in phosphate glass: three levels, and a lifetime of many periods. */
const erbium: Changes = {
  medium: {
    wavelength: 1535e-9,
    length: 10e-3,
    emissionCrossSection: 0.8e-24,
    absorptionCrossSection: 0.7e-24,
    ionDensity: 1e25,
    upperLevelLifetime: 8e-3,
    refractiveIndex: 1.53,
    groupIndex: 1.53,
  },
  pump: { wavelength: 976e-9, duration: 3e-3, power: 60, beam: flat },
  resonator: { length: 60e-3, outputReflectivity: 0.9, roundTripLoss: 0.03 },
  qSwitch: { opensAt: 3e-3, repetitionRate: 100, gate: 2e-3 },
};
const pulsedCases: [string, Changes][] = [
  ['flat under flat', { resonator: { ...erbium.resonator, beam: flat } }],
  ['flat under Gaussian', { resonator: { ...erbium.resonator, beam: gaussian } }],
  [
    'Gaussian under Gaussian',
    { pump: { ...erbium.pump, beam: gaussian }, resonator: { ...erbium.resonator, beam: gaussian } },
  ],
  ['Gaussian under flat', { pump: { ...erbium.pump, beam: gaussian }, resonator: { ...erbium.resonator, beam: flat } }],
  [
    'flat under Gaussian, opened late',
    { resonator: { ...erbium.resonator, beam: gaussian }, qSwitch: { ...erbium.qSwitch, opensAt: 4e-3 } },
  ],
];

describe('a pulsed pump and a lifetime of many periods', () => {
  it.each(pulsedCases)('settles where opening after opening does: %s', (_, changes) => {
    const { figures, brute } = expectSame({ ...erbium, ...changes }, 60);
    // What earlier pulses left must count, or this shows nothing.
    expect(figures.pulse!.energy_J / brute.first!).toBeGreaterThan(1.01);
  });
});

describe('stored energy of a settled train', () => {
  it('counts what piles up outside the mode, which no pulse takes', () => {
    // Each pulse empties the mode, so its gain repeats at once; the ions around it still gather for ten lifetimes.
    const module = flatModule({
      medium: { upperLevelLifetime: 8e-3 },
      pump: { duration: 0.5e-3 },
      qSwitch: { opensAt: 0.5e-3, repetitionRate: 500, gate: 1e-3 },
    });
    const wide = { profile: 'flat', radius: 3 * module.resonator.beam.radius } as const;
    const { figures } = outcomeOf(moduleWith({ pump: { beam: wide, power: 4000 } }, module));
    const { power, absorbedFraction, quantumEfficiency, wavelength } = { ...module.pump, power: 4000 };
    const rate = (power * absorbedFraction * quantumEfficiency * wavelength) / (h * c);
    const fresh = rate * 8e-3 * -Math.expm1(-0.5 / 8);
    const around = ((8 / 9) * fresh) / -Math.expm1(-2 / 8);
    const ions = (figures.state.stored_energy_J! * 1064e-9) / (h * c);
    expect(ions).toBeGreaterThan(around);
    expect(ions).toBeLessThan(around + (1.2 / 9) * fresh);
  });
});

const neodymium: Changes = {
  medium: { upperLevelLifetime: 230e-6 },
  pump: { kind: 'continuous', power: 30, beam: flat },
  resonator: { outputReflectivity: 0.9, roundTripLoss: 0.04, beam: gaussian },
  qSwitch: { repetitionRate: 8000, gate: 40e-6, opensAt: 1 / 8000 },
};
const continuousCases: [string, Changes, number][] = [
  ['flat under Gaussian', {}, 40],
  ['flat under flat', { resonator: { ...neodymium.resonator, beam: flat } }, 40],
  ['Gaussian under Gaussian', { pump: { ...neodymium.pump, beam: gaussian } }, 40],
  ['at a high rate', { qSwitch: { ...neodymium.qSwitch, repetitionRate: 40e3, gate: 12e-6 } }, 150],
  ['with a bottleneck', { medium: { upperLevelLifetime: 230e-6, inversionReductionFactor: 1.47 } }, 40],
  [
    'with reabsorption',
    { medium: { upperLevelLifetime: 230e-6, absorptionCrossSection: 1e-25, ionDensity: 1e26 } },
    40,
  ],
];

describe('a continuous pump', () => {
  it.each(continuousCases)('settles where pulse after pulse does: %s', (_, changes, openings) => {
    const { figures, brute } = expectSame({ ...neodymium, ...changes }, openings);
    expect(apart(figures.pulse!.energy_J, brute.first!)).toBeGreaterThan(1e-4);
  });

  it('of one inversion settles where the Lambert function takes it', () => {
    const rate = 15e3;
    const base = flatModule({
      pump: { kind: 'continuous' },
      qSwitch: { repetitionRate: rate, gate: 30e-6, opensAt: 1 / rate },
    });
    const loss = lossOf(base);
    const ceiling = 3.2;
    const kept = Math.exp(-1 / (rate * 230e-6));
    let before = 0;
    let after = 0;
    for (let opening = 0; opening < 200; opening++) {
      before = ceiling + (after - ceiling) * kept;
      after = before > 1 ? -lambertW0(-before * Math.exp(-before)) : before;
    }
    const { figures } = outcomeOf(pumpedTo(ceiling * loss, base));
    expect(apart(figures.state.inversion_ratio!, before)).toBeLessThan(1e-8);
  });

  it('fills the store during a pause, whatever the rate was', () => {
    const slow = moduleWith({ ...neodymium, qSwitch: { repetitionRate: 10, gate: 40e-6, opensAt: 0.1 } });
    const full = outcomeOf(slow).figures.pulse!.energy_J;
    for (const repetitionRate of [500, 8000, 30e3]) {
      const { figures } = outcomeOf(moduleWith({ qSwitch: { repetitionRate, gate: 0.4 / repetitionRate } }, slow));
      expect(apart(figures.train.pulse_after_pause_energy_J!, full)).toBeLessThan(1e-9);
      expect(figures.pulse!.energy_J).toBeLessThan(full);
    }
  });
});

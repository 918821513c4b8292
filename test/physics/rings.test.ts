import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { gainShares, roundTripGain } from '../../extension/core/physics/cavity.ts';
import { courseAt } from '../../extension/core/physics/depletion.ts';
import { fire } from '../../extension/core/physics/fire.ts';
import { bruteTrain } from './brute-force.ts';
import { designs } from './designs.ts';
import { apart, c, cavityAndStore, h, moduleWith } from './modules.ts';

const W = 0.8e-3;
const profiles = ['flat', 'gaussian'] as const;

function courseOf(module: ReturnType<typeof moduleWith>, x: number) {
  const { cavity, store } = cavityAndStore(module);
  const depletion = { gain: gainShares(cavity, store.ions), intensity: cavity.rings.intensity, loss: 1, start: 0 };
  return courseAt(depletion, x);
}

function moduleOf(pump: (typeof profiles)[number], mode: (typeof profiles)[number], ratio: number) {
  return moduleWith({
    pump: { beam: { profile: pump, radius: ratio * W } },
    resonator: { beam: { profile: mode, radius: W } },
  });
}

/** 2σ × ions stored over the whole plane, m²: what the gain is before it is weighted with the mode. */
const twoSigmaIons = (2 * 2.8e-23 * 600 * 0.85 * 0.95 * 808e-9 * 230e-6 * (1 - Math.exp(-200 / 230))) / (h * c);

/** γ(s, x)/x^s, by its series (Abramowitz & Stegun 6.5.29). */
function lowerGamma(s: number, x: number): number {
  let term = 1 / s;
  let sum = term;
  for (let k = 1; term > 1e-17 * sum; k++) {
    term *= x / (s + k);
    sum += term;
  }
  return sum * Math.exp(-x);
}

/** What a depletion leaves is judged by the gain at the start: e^−40 of it matters to nobody. */
function expectGain(module: ReturnType<typeof moduleWith>, x: number, wanted: number, tolerance: number) {
  expect(Math.abs(courseOf(module, x).gain - wanted) / courseOf(module, 0).gain).toBeLessThan(tolerance);
}

describe('gain and its depletion on rings', () => {
  const ratios = [0.3, 0.7, 1, 1.9, 3];
  const depletions = [0, 1e-3, 0.3, 2, 9, 40];

  it.each(ratios)('flat pump of %d times a Gaussian mode', (ratio) => {
    const edge = Math.exp(-2 * ratio ** 2);
    const scale = twoSigmaIons / (Math.PI * (ratio * W) ** 2);
    for (const x of depletions) {
      const wanted = x === 0 ? 1 - edge : (-Math.exp(-x * edge) * Math.expm1(-x * (1 - edge))) / x;
      expectGain(moduleOf('flat', 'gaussian', ratio), x, scale * wanted, 1e-10);
    }
  });

  it.each(ratios)('Gaussian pump of %d times a Gaussian mode', (ratio) => {
    const exponent = ratio ** -2;
    const scale = (2 * twoSigmaIons) / (Math.PI * (ratio * W) ** 2);
    for (const x of depletions) {
      const wanted = scale * lowerGamma(exponent + 1, x);
      expectGain(moduleOf('gaussian', 'gaussian', ratio), x, wanted, 1e-9);
    }
  });

  it.each(ratios)('a pump of %d times a flat mode: the mean inversion within it', (ratio) => {
    const within = { flat: Math.min(1, ratio ** -2), gaussian: 1 - Math.exp(-2 / ratio ** 2) };
    for (const pump of profiles) {
      for (const x of depletions) {
        const wanted = (twoSigmaIons * within[pump] * Math.exp(-x)) / (Math.PI * W ** 2);
        expectGain(moduleOf(pump, 'flat', ratio), x, wanted, 1e-12);
      }
    }
  });

  it('G is the slope of its integral', () => {
    const module = moduleOf('gaussian', 'gaussian', 1.4);
    const difference = courseOf(module, 1.001).field + 1.001 - (courseOf(module, 0.999).field + 0.999);
    expect(apart(difference / 0.002, courseOf(module, 1).gain)).toBeLessThan(1e-6);
  });
});

describe('rings over the design space', () => {
  it('give the gain and the depletion of a pulse as by brute force in the radius', () => {
    fc.assert(
      fc.property(designs, (module) => {
        const { cavity, store } = cavityAndStore(module);
        const brute = bruteTrain(module, 1);
        expect(apart(roundTripGain(cavity, store.ions), brute.gain)).toBeLessThan(1e-9);
        expect(apart(fire(cavity, store)!.depletion, brute.depletion)).toBeLessThan(1e-6);
      }),
      { numRuns: 600, seed: 3 },
    );
  });
});

describe('reabsorption', () => {
  it('of a ruby-like medium needs more than half the ions excited', () => {
    const medium = { absorptionCrossSection: 2.5e-24, emissionCrossSection: 2.5e-24, ionDensity: 1.6e25 };
    const beam = { profile: 'flat', radius: 1e-3 } as const;
    const rate = (0.85 * 0.95 * 808e-9 * 230e-6 * (1 - Math.exp(-200 / 230))) / (h * c * Math.PI * beam.radius ** 2);
    const half = (0.5 * 1.6e25 * 0.06) / rate;
    const gainAt = (power: number) => {
      const { cavity, store } = cavityAndStore(moduleWith({ medium, pump: { power, beam }, resonator: { beam } }));
      return roundTripGain(cavity, store.ions);
    };
    expect(gainAt(half * 0.999)).toBeLessThan(0);
    expect(gainAt(half * 1.001)).toBeGreaterThan(0);
    // All excited gains as much as none absorbs.
    expect(apart(gainAt(2 * half), -gainAt(0))).toBeLessThan(1e-12);
    expect(apart(gainAt(2 * half), 2 * 2.5e-24 * 1.6e25 * 0.06)).toBeLessThan(1e-12);
  });
});

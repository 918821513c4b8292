import { describe, expect, it } from 'vitest';
import { cavityOf } from '../../extension/core/physics/cavity.ts';
import type { GainModule } from '../../extension/core/physics/gain-module.ts';
import { openingLoss } from '../../extension/core/physics/opening.ts';
import { apart, type Changes, coldStore, moduleWith, outcomeOf, roundTripTimeOf } from './modules.ts';
import { disc, rawPulse } from './raw-rate-equations.ts';

const gaussian = { profile: 'gaussian', radius: 0.9e-3 } as const;
const flat = { profile: 'flat', radius: 0.9e-3 } as const;
const cases: [string, Changes][] = [
  ['flat pump under a Gaussian mode', { qSwitch: { closedLoss: 0.995 } }],
  [
    'one inversion',
    { pump: { beam: flat }, resonator: { beam: flat, roundTripLoss: 0.06 }, qSwitch: { closedLoss: 0.999 } },
  ],
  ['Gaussian under Gaussian', { pump: { beam: gaussian, power: 300 }, qSwitch: { closedLoss: 0.99 } }],
  ['no closed loss given', {}],
  ['near threshold', { pump: { power: 330 }, qSwitch: { closedLoss: 0.9 } }],
];

function opened(changes: Changes, openingTime: number): GainModule {
  return moduleWith({ ...changes, qSwitch: { ...changes.qSwitch, openingTime } });
}

function figuresAt(changes: Changes, openingTime: number) {
  const { model, pulse } = outcomeOf(opened(changes, openingTime)).figures;
  return { model, values: [pulse!.energy_J, pulse!.peak_power_W, pulse!.width_fwhm_s, pulse!.build_up_time_s!] };
}

describe('the loss of an opening switch', () => {
  it.each([0.5, 0.995, undefined])('ramps the transmission as a raised cosine from a closed loss of %s', (closed) => {
    const cavity = cavityOf(opened(closed === undefined ? {} : { qSwitch: { closedLoss: closed } }, 40e-9));
    const transmission = (time: number) => Math.exp(-openingLoss(cavity, time));
    const shut = closed ?? 1;
    expect(transmission(0)).toBeCloseTo(1 - shut, 12);
    expect(transmission(10e-9)).toBeCloseTo(1 - shut * (0.5 + Math.SQRT1_2 / 2), 12);
    expect(transmission(20e-9)).toBeCloseTo(1 - shut / 2, 12);
    expect(transmission(30e-9)).toBeCloseTo(1 - shut * (0.5 - Math.SQRT1_2 / 2), 12);
    expect(transmission(40e-9)).toBe(1);
    expect(transmission(1)).toBe(1);
  });
});

describe.each(cases)('a switch that opens slowly: %s', (_, changes) => {
  it('becomes the instantaneous one', () => {
    const none = figuresAt(changes, 0).values;
    figuresAt(changes, 1e-15).values.forEach((value, i) => {
      expect(apart(value, none[i]!)).toBeLessThan(1e-7);
    });
  });

  it('gives the same figures on both sides of the change of method', () => {
    let low = 1e-10;
    let high = 2e-6;
    expect(figuresAt(changes, low).model).toBe('depletion');
    expect(figuresAt(changes, high).model).toBe('time_integration');
    while (high / low > 1 + 1e-9) {
      const middle = Math.sqrt(low * high);
      if (figuresAt(changes, middle).model === 'depletion') low = middle;
      else high = middle;
    }
    const below = figuresAt(changes, low).values;
    figuresAt(changes, high).values.forEach((value, i) => {
      expect(apart(value, below[i]!)).toBeLessThan(1e-5);
    });
  });

  it('changes the figures without a step as the ramp gets longer', () => {
    const ramps = Array.from({ length: 350 }, (_, i) => 1e-10 * 1.02 ** i);
    const found = ramps.map((openingTime) => figuresAt(changes, openingTime).values);
    for (let i = 1; i + 1 < found.length; i++) {
      found[i]!.forEach((value, k) => {
        const bend = found[i + 1]![k]! - 2 * value + found[i - 1]![k]!;
        expect(Math.abs(bend / value), `figure ${k} after a ramp of ${ramps[i]} s`).toBeLessThan(1e-3);
      });
    }
  });
});

describe('a slow opening solved independently', () => {
  it.each([20e-9, 60e-9, 150e-9])('gives the same pulse after a ramp of %d s', (openingTime) => {
    const module = opened({ qSwitch: { closedLoss: 0.995 } }, openingTime);
    const { model, values } = figuresAt({ qSwitch: { closedLoss: 0.995 } }, openingTime);
    const { total } = coldStore(cavityOf(module));
    const raw = rawPulse({
      wavelength: 1064e-9,
      crossSection: 2.8e-23,
      roundTripTime: roundTripTimeOf(module),
      reflectivity: 0.5,
      roundTripLoss: 0.06,
      closedLoss: 0.995,
      openingTime,
      modeArea: (Math.PI * 0.9e-3 ** 2) / 2,
      rings: disc(1.7e-3, 60).map(({ r, area }) => ({
        ions: total / (Math.PI * 1.7e-3 ** 2),
        psi: Math.exp(-2 * (r / 0.9e-3) ** 2),
        area,
      })),
    });
    if (openingTime > 100e-9) expect(model).toBe('time_integration');
    [raw.energy, raw.peakPower, raw.width, raw.buildUp].forEach((value, i) => {
      expect(apart(values[i]!, value)).toBeLessThan(1e-6);
    });
  });
});

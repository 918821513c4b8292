import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { GainModule } from '../../extension/core/physics/gain-module.ts';
import type { Outcome } from '../../extension/core/physics/predict.ts';
import { designs, withoutHoldOff } from './designs.ts';
import { apart, moduleWith, outcomeOf } from './modules.ts';

const options = { numRuns: 150, seed: 5 };

function scaled(module: GainModule, k: number): GainModule {
  const beam = <B extends { readonly radius: number }>(one: B): B => ({ ...one, radius: k * one.radius });
  return moduleWith(
    {
      pump: { beam: beam(module.pump.beam), power: k ** 2 * module.pump.power },
      resonator: { beam: beam(module.resonator.beam) },
    },
    module,
  );
}

/** Every number anywhere in the figures, with its path. */
function numbersIn(value: unknown, path = ''): [string, number][] {
  if (typeof value === 'number') return [[path, value]];
  if (typeof value !== 'object' || value === null) return [];
  return Object.entries(value).flatMap(([key, inner]) => numbersIn(inner, `${path}.${key}`));
}

function expectFinite({ figures, holdOffMargin, train }: Outcome) {
  const numbers = numbersIn({ figures, ...(holdOffMargin !== undefined && { holdOffMargin }), work: train.work });
  const broken = numbers.filter(([, number]) => !Number.isFinite(number));
  expect(broken).toEqual([]);
  const waveform = train.settled?.waveform(50);
  if (waveform) expect(numbersIn(waveform).filter(([, number]) => !Number.isFinite(number))).toEqual([]);
}

describe('what holds for every design', () => {
  it('energy is no more than what is stored, and agrees with its peak and widths', () => {
    fc.assert(
      fc.property(designs, (module) => {
        const { figures } = outcomeOf(module);
        const { pulse, state } = figures;
        expect(pulse!.energy_J).toBeLessThan(state.stored_energy_J!);
        expect(state.extraction_efficiency!).toBeLessThan(1);
        expect(apart(pulse!.width_equivalent_s * pulse!.peak_power_W, pulse!.energy_J)).toBeLessThan(1e-12);
        // A giant pulse is fuller than its half width at the peak, and never longer than 1.5 such widths.
        expect(pulse!.width_equivalent_s / pulse!.width_fwhm_s).toBeGreaterThan(1);
        expect(pulse!.width_equivalent_s / pulse!.width_fwhm_s).toBeLessThan(1.5);
        expect(apart(state.inversion_ratio! * state.round_trip_loss_log, state.round_trip_gain_log!)).toBeLessThan(
          1e-12,
        );
      }),
      options,
    );
  });

  it('k times wider beams under k² times the power: k² times the energy in the same time', () => {
    fc.assert(
      fc.property(designs, fc.double({ min: 1, max: 20, noNaN: true }), (module, k) => {
        const small = outcomeOf(module).figures;
        const large = outcomeOf(scaled(module, k)).figures;
        expect(apart(large.pulse!.energy_J, k ** 2 * small.pulse!.energy_J)).toBeLessThan(1e-7);
        expect(apart(large.pulse!.peak_power_W, k ** 2 * small.pulse!.peak_power_W)).toBeLessThan(1e-7);
        expect(apart(large.pulse!.width_fwhm_s, small.pulse!.width_fwhm_s)).toBeLessThan(1e-7);
        expect(apart(large.state.inversion_ratio!, small.state.inversion_ratio!)).toBeLessThan(1e-9);
      }),
      options,
    );
  });

  it('a longer round trip stretches the pulse and leaves its energy', () => {
    fc.assert(
      fc.property(designs, (module) => {
        const short = outcomeOf(module).figures.pulse!;
        const path = 0.18 + 0.835 * 0.06;
        const stretched = moduleWith({ qSwitch: { extraOpticalPath: path } }, module);
        const long = outcomeOf(stretched).figures.pulse!;
        expect(apart(long.energy_J, short.energy_J)).toBeLessThan(1e-12);
        expect(apart(long.width_fwhm_s, 2 * short.width_fwhm_s)).toBeLessThan(1e-9);
        expect(apart(long.peak_power_W, short.peak_power_W / 2)).toBeLessThan(1e-9);
        expect(apart(long.build_up_time_s!, 2 * short.build_up_time_s!)).toBeLessThan(1e-9);
      }),
      options,
    );
  });

  it('more pump, more energy and peak, less delay', () => {
    const more = fc.double({ min: 1.001, max: 1.5, noNaN: true });
    fc.assert(
      fc.property(designs, more, (module, factor) => {
        const weaker = withoutHoldOff(module);
        const less = outcomeOf(weaker).figures.pulse!;
        const most = outcomeOf(moduleWith({ pump: { power: factor * module.pump.power } }, weaker)).figures.pulse!;
        expect(most.energy_J).toBeGreaterThan(less.energy_J);
        expect(most.peak_power_W).toBeGreaterThan(less.peak_power_W);
        expect(most.build_up_time_s!).toBeLessThan(less.build_up_time_s!);
      }),
      options,
    );
  });
});

describe('no figure is ever NaN or infinite', () => {
  const wild = fc.record({
    power: fc.oneof(fc.constant(0), fc.double({ min: 1e-6, max: 1e6, noNaN: true })),
    rate: fc.double({ min: 0.1, max: 2e5, noNaN: true }),
    openingTime: fc.constantFrom(0, 1e-12, 5e-9, 2e-7, 1e-5),
    closedLoss: fc.constantFrom(undefined, 1e-3, 0.5, 0.995, 1 - 1e-12),
    kind: fc.constantFrom('pulsed' as const, 'continuous' as const),
    lifetime: fc.double({ min: 1e-6, max: 2e-2, noNaN: true }),
    lower: fc.constantFrom(undefined, 2e-10, 2e-8, 1e-5),
  });

  it('whatever the pump, rate, switch and lifetimes', () => {
    fc.assert(
      fc.property(designs, wild, (base, w) => {
        const module = moduleWith(
          {
            medium: {
              upperLevelLifetime: w.lifetime,
              ...(w.lower !== undefined && { lowerLevelLifetime: w.lower, lowerLevelWeight: 0.47 }),
            },
            pump: { kind: w.kind, power: w.power },
            qSwitch: {
              repetitionRate: w.rate,
              openingTime: w.openingTime,
              opensAt: w.kind === 'continuous' ? 1 / w.rate : 200e-6,
              gate: 0.5 / w.rate,
              ...(w.closedLoss !== undefined && { closedLoss: w.closedLoss }),
            },
          },
          base,
        );
        expectFinite(outcomeOf(module));
      }),
      { numRuns: 150, seed: 6 },
    );
  });
});

import { describe, expect, test } from 'vitest';
import type { Analysis } from '../../extension/core/analyse.ts';
import { createExplorer } from '../../extension/core/explore/explorer.ts';
import { EFFECT_NAMES } from '../../extension/core/explore/sensitivity.ts';
import { analysed, demo, pulseOf, quick } from './designs.ts';

const sensitivityOf = (analysis: Analysis, path: string) => createExplorer(analysis).sensitivity(path);

const written = [
  ['pump.power', 'power: 600 W ± 3 %', (k: number) => `power: ${600 * k} W ± 3 %`],
  ['pump.duration', 'duration: 200 us', (k: number) => `duration: ${200 * k} us`],
  ['resonator.output_reflectivity', '50 % ± 2 %', (k: number) => `${50 * k} % ± 2 %`],
  ['resonator.round_trip_loss', 'round_trip_loss: 6 %', (k: number) => `round_trip_loss: ${6 * k} %`],
  ['resonator.length', 'length: 180 mm', (k: number) => `length: ${180 * k} mm`],
  ['gain_medium.refractive_index', 'refractive_index: 1.82', (k: number) => `refractive_index: ${1.82 * k}`],
  ['gain_medium.emission_cross_section', '2.8e-19 cm2', (k: number) => `${2.8e-19 * k} cm2`],
] as const;

describe.each([
  ['by the depletion model', quick.replace('  opens_at: 200 us\n', '')],
  ['integrated in time', demo.replace('  opens_at: 200 us\n', '')],
])('a sensitivity %s', (_, text) => {
  // Five-point difference quotient of the edited text's own predictions: another step, another formula, another door.
  test.each(written)('to %s is the derivative of the figures by the text', (path, before, after) => {
    const h = 4e-3;
    const at = (k: number) => pulseOf(text.replace(before, after(1 + k * h)));
    const [a, b, c, d] = [at(-2), at(-1), at(1), at(2)];
    const here = pulseOf(text);
    const found = sensitivityOf(analysed(text), path);
    expect(found?.oneSided).toBe(false);
    for (const name of ['energy', 'peak', 'width'] as const) {
      const derivative = (a[name] - 8 * b[name] + 8 * c[name] - d[name]) / (12 * h) / here[name];
      expect(found?.effects[name]).toBeCloseTo(derivative, 4);
    }
  });

  // Euler's theorem: with the pump power times k and every beam's area times k, a module is k modules side by side.
  test('adds up over power and areas as it must: energy once, peak once, width not at all', () => {
    const analysis = analysed(text);
    const effects = (path: string) => sensitivityOf(analysis, path)?.effects ?? {};
    const [power, pumpRadius, modeRadius] = ['pump.power', 'pump.beam.radius', 'resonator.beam.radius'].map(effects);
    const total = (name: 'energy' | 'peak' | 'width') =>
      (power?.[name] ?? Number.NaN) + ((pumpRadius?.[name] ?? Number.NaN) + (modeRadius?.[name] ?? Number.NaN)) / 2;
    expect(total('energy')).toBeCloseTo(1, 4);
    expect(total('peak')).toBeCloseTo(1, 4);
    expect(total('width')).toBeCloseTo(0, 4);
  });
});

test('the margin is that of the surface that is tightest, whatever else moves', () => {
  const analysis = analysed(demo);
  // Margin = threshold(width)/fluence: on the tightest surface a wider beam lowers fluence as its square.
  const { energy = 0, width = 0 } = sensitivityOf(analysis, 'pump.power')?.effects ?? {};
  const { margin = 0 } = sensitivityOf(analysis, 'pump.power')?.effects ?? {};
  const exponents = [0.5, 0.3].map((exponent) => exponent * width - energy);
  expect(Math.min(...exponents.map((expected) => Math.abs(margin - expected)))).toBeLessThan(1e-3);
  const index = analysis.prediction?.surfaces.map(({ margin: one = 0 }, at) => one / [2, 2, 3][at]!) ?? [];
  const tightest = index.indexOf(Math.min(...index));
  expect(sensitivityOf(analysis, `surfaces[${tightest}].beam_radius`)?.effects.margin).toBeCloseTo(2, 3);
});

describe('where a value has no smooth neighbourhood', () => {
  test('an opening at the very end of the pump is told as one-sided', () => {
    const found = sensitivityOf(analysed(demo), 'q_switch.opens_at');
    expect(found?.oneSided).toBe(true);
    // Later: the store decays by 1 % of 200 us out of a lifetime of 230 us. Earlier: pump pulses would be lost.
    expect(found?.effects.energy).toBeLessThan(0);
  });

  test('a fraction of 100 % can only fall', () => {
    const found = sensitivityOf(
      analysed(demo.replace('absorbed_fraction: 85 %', 'absorbed_fraction: 100 %')),
      'pump.absorbed_fraction',
    );
    expect(found?.oneSided).toBe(true);
    expect(found?.effects.energy).toBeGreaterThan(1);
  });

  test.each([
    ['a word', 'pump.kind'],
    ['a section', 'pump'],
    ['a requirement', 'requirements.pulse_energy.min'],
    ['nothing', 'gain_medium.colour'],
    ['a default of nought', 'q_switch.opening_time'],
    ['no path', ''],
  ])('%s has no sensitivity', (_, path) => {
    expect(sensitivityOf(analysed(quick), path)).toBeUndefined();
  });

  test('without a pulse there is none', () => {
    expect(sensitivityOf(analysed(demo.replace('600 W', '6 W')), 'pump.power')).toBeUndefined();
    expect(sensitivityOf(analysed(''), 'pump.power')).toBeUndefined();
  });
});

test('a value from the property table has one too', () => {
  const without = demo.replace('  upper_level_lifetime: 230 us\n', '');
  expect(sensitivityOf(analysed(without), 'gain_medium.upper_level_lifetime')?.effects.energy).toBeGreaterThan(0);
});

describe('the spread by tolerances', () => {
  test('is the root of the sum of squares, and names the largest part', () => {
    const explorer = createExplorer(analysed(demo));
    const parts = [
      ['pump.power', 0.03],
      ['resonator.length', 0.5 / 180],
      ['resonator.output_reflectivity', 0.02 / 0.5],
    ] as const;
    for (const name of EFFECT_NAMES) {
      const each = parts.map(([path, relative]) => (explorer.sensitivity(path)?.effects[name] ?? 0) * relative);
      const spread = explorer.spreads()[name];
      expect(spread?.relative).toBeCloseTo(Math.hypot(...each), 12);
      const largest = each.map(Math.abs).indexOf(Math.max(...each.map(Math.abs)));
      expect(spread?.dominant).toBe(parts[largest]?.[0]);
      expect(spread?.share).toBeCloseTo(each[largest]! ** 2 / Math.hypot(...each) ** 2, 12);
    }
  });

  test('is nothing where no tolerance is written', () => {
    expect(createExplorer(analysed(demo.replace(/ ± [\d.]+ (%|mm)/g, ''))).spreads()).toEqual({});
  });
});

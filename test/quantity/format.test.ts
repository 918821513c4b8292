import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { DIMENSIONS, type DimensionName } from '../../extension/core/quantity/dimension.ts';
import { formatPercent, formatQuantity } from '../../extension/core/quantity/format.ts';
import { quantityOf } from './helpers.ts';

const PRINTED: readonly (readonly [number, DimensionName, string])[] = [
  [0.0131, 'energy', '13.1 mJ'],
  [1.22e6, 'power', '1.22 MW'],
  [9.3e-9, 'time', '9.30 ns'],
  [0.262, 'power', '262 mW'],
  [999.96e-6, 'length', '1.00 mm'],
  [999.4e-6, 'length', '999 µm'],
  [1.064e-6, 'length', '1.06 µm'],
  [-3e-3, 'length', '-3.00 mm'],
  [12_345, 'length', '12.3 km'],
  [12_345, 'time', '12300 s'],
  [1.2e5, 'fluence', '12.0 J/cm2'],
  [5e3, 'fluence', '500 mJ/cm2'],
  [2e13, 'intensity', '2.00 GW/cm2'],
  [2.8e-23, 'cross_section', '2.80e-19 cm2'],
  [1.38e26, 'number_density', '1.38e20 cm-3'],
  [6.2e-20, 'nonlinear_index', '6.20e-20 m2/W'],
  [7.3e-6, 'per_temperature', '7.30e-6 K-1'],
  [30, 'inverse_length', '0.300 cm-1'],
  [0.95, 'ratio', '0.950'],
  [123.4, 'ratio', '123'],
  [20, 'frequency', '20.0 Hz'],
  [12_500, 'frequency', '12.5 kHz'],
  [298.15, 'temperature', '298 K'],
  [1.5e-3, 'angle', '1.50 mrad'],
  [10.7, 'thermal_conductivity', '10.7 W/(m.K)'],
  [2.545e-6, 'area', '2.55 mm2'],
  [1.2e-8, 'area', '0.0120 mm2'],
  [1e-10, 'area', '100 µm2'],
  [5e-4, 'area', '5.00 cm2'],
  [1.1, 'slope_efficiency', '1.10 W/A'],
  [3200, 'voltage', '3.20 kV'],
  [0, 'energy', '0 J'],
  [-0, 'fluence', '0 J/cm2'],
  [0, 'ratio', '0'],
];

describe('formatQuantity', () => {
  it.each(PRINTED)('%d as %s is %s', (value, dimension, text) => {
    expect(formatQuantity(value, dimension)).toBe(text);
  });

  it('keeps the digits that are asked for', () => {
    expect(formatQuantity(0.013_096, 'energy', 1)).toBe('10 mJ');
    expect(formatQuantity(0.013_096, 'energy', 2)).toBe('13 mJ');
    expect(formatQuantity(0.013_096, 'energy', 6)).toBe('13.0960 mJ');
    expect(formatQuantity(0.013_096, 'energy', Number.NaN)).toBe('10 mJ');
    expect(formatQuantity(0.95, 'ratio', 99)).toBe('0.94999999999999996');
  });

  it('gives a dash for what is no number', () => {
    expect(formatQuantity(Number.NaN, 'energy')).toBe('— J');
    expect(formatPercent(Number.POSITIVE_INFINITY)).toBe('— %');
  });

  it('reads back within rounding, whatever the value', () => {
    const name = fc.constantFrom(...(Object.keys(DIMENSIONS) as DimensionName[]));
    const value = fc.oneof(
      fc.double({ noNaN: true, noDefaultInfinity: true, min: -1e290, max: 1e290 }),
      fc
        .tuple(fc.double({ min: 1, max: 10, noNaN: true }), fc.integer({ min: -30, max: 30 }))
        .map(([m, e]) => m * 10 ** e),
    );
    fc.assert(
      fc.property(value, name, fc.integer({ min: 1, max: 17 }), (si, dimension, digits) => {
        const text = formatQuantity(si, dimension, digits);
        expect(text).not.toMatch(/NaN|undefined|Infinity/);
        // Subnormal numbers have fewer digits than are printed, and may fall to zero in another unit.
        if (Math.abs(si) < 1e-290) return;
        const back = quantityOf(text, dimension).value;
        expect(Math.abs(back - si), text).toBeLessThanOrEqual(Math.abs(si) * (0.5000001 * 10 ** (1 - digits) + 1e-15));
      }),
      { numRuns: 3000 },
    );
  });

  it('always shows the same number of significant digits and no exponent where a prefix exists', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1e-15, max: 1e12, noNaN: true }),
        fc.integer({ min: 3, max: 9 }),
        (watts, digits) => {
          const text = formatQuantity(watts, 'power', digits);
          expect(text).toMatch(/^[1-9]\d{0,2}(\.\d+)? \S?W$/);
          expect(text.replace(/[^\d]/g, '')).toHaveLength(digits);
        },
      ),
    );
  });
});

describe('formatPercent', () => {
  it.each([
    [0.5, '50.0 %'],
    [0.995, '99.5 %'],
    [0.999_96, '100 %'],
    [0.0123, '1.23 %'],
    [0, '0 %'],
    [-0.03, '-3.00 %'],
    [12.5, '1250 %'],
  ])('%d is %s', (fraction, text) => {
    expect(formatPercent(fraction)).toBe(text);
  });
});

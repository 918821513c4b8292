import { describe, expect, it } from 'vitest';
import { DIMENSIONS, type DimensionName } from '../../extension/core/quantity/dimension.ts';
import { readQuantity } from '../../extension/core/quantity/quantity.ts';
import { quantityOf } from './helpers.ts';

type Spelling = readonly [text: string, dimension: DimensionName, si: number];

// Exactly what the decimal text says, not a neighbour of it.
const EXACT: readonly Spelling[] = [
  ['1.30 mm', 'length', 1.3e-3],
  ['1064 nm', 'length', 1.064e-6],
  ['1.064 um', 'length', 1.064e-6],
  ['1.064 \u00b5m', 'length', 1.064e-6],
  ['1.064 \u03bcm', 'length', 1.064e-6],
  ['1.3mm', 'length', 1.3e-3],
  ['+.5 cm', 'length', 5e-3],
  ['5. m', 'length', 5],
  ['-0 mm', 'length', 0],
  ['5\u00a0mm', 'length', 5e-3],
  ['1 in', 'length', 0.0254],
  ['10 \u00c5', 'length', 1e-9],
  ['2.5 mm2', 'area', 2.5e-6],
  ['2.8e-19 cm2', 'cross_section', 2.8e-23],
  ['2.8E-19 cm^2', 'cross_section', 2.8e-23],
  ['2.8e-19 cm²', 'cross_section', 2.8e-23],
  ['2.8e-19 cm**2', 'cross_section', 2.8e-23],
  ['0 cm2', 'cross_section', 0],
  ['1.38e20 cm-3', 'number_density', 1.38e26],
  ['1.38e20 cm^-3', 'number_density', 1.38e26],
  ['1.38e20 cm**-3', 'number_density', 1.38e26],
  ['1.38e20 cm⁻³', 'number_density', 1.38e26],
  ['1.38e20 cm\u22123', 'number_density', 1.38e26],
  ['1.38e20 1/cm3', 'number_density', 1.38e26],
  ['1.38e20 /cm3', 'number_density', 1.38e26],
  ['1.38e20/cm³', 'number_density', 1.38e26],
  ['100 us', 'time', 1e-4],
  ['230 \u00b5s', 'time', 2.3e-4],
  ['5 min', 'time', 300],
  ['2 h', 'time', 7200],
  ['20 Hz', 'frequency', 20],
  ['12.5 kHz', 'frequency', 12500],
  ['20 s-1', 'frequency', 20],
  ['30 /min', 'frequency', 0.5],
  ['600 W', 'power', 600],
  ['600 mW', 'power', 0.6],
  ['600 MW', 'power', 6e8],
  ['3 J/s', 'power', 3],
  ['13.1 mJ', 'energy', 0.0131],
  ['1 eV', 'energy', 1.602176634e-19],
  ['5eV', 'energy', 8.01088317e-19],
  ['90 A', 'current', 90],
  ['3.2 kV', 'voltage', 3200],
  ['1.1 W/A', 'slope_efficiency', 1.1],
  ['1.1 mW/mA', 'slope_efficiency', 1.1],
  ['10 J/cm2', 'fluence', 1e5],
  ['10 J / cm^2', 'fluence', 1e5],
  ['10 J.cm-2', 'fluence', 1e5],
  ['10 J cm⁻²', 'fluence', 1e5],
  ['10 J·cm-2', 'fluence', 1e5],
  ['10 J*cm-2', 'fluence', 1e5],
  ['10 J**1*cm**-2', 'fluence', 1e5],
  ['0.5 GW/cm2', 'intensity', 5e12],
  ['5 J/(cm2.ns)', 'intensity', 5e13],
  ['300 K', 'temperature', 300],
  ['25 Cel', 'temperature', 298.15],
  ['-40 °C', 'temperature', 233.15],
  ['25 ℃', 'temperature', 298.15],
  ['1.5 mrad', 'angle', 1.5e-3],
  ['180 deg', 'angle', Math.PI],
  ['90°', 'angle', Math.PI / 2],
  ['10.7 W/(m.K)', 'thermal_conductivity', 10.7],
  ['10.7 W/(m K)', 'thermal_conductivity', 10.7],
  ['10.7 W/(m·K)', 'thermal_conductivity', 10.7],
  ['10.7 W m-1 K-1', 'thermal_conductivity', 10.7],
  ['10.7 W.(m.K)-1', 'thermal_conductivity', 10.7],
  ['0.107 (W/cm)/K', 'thermal_conductivity', 10.7],
  ['7.3e-6 1/K', 'per_temperature', 7.3e-6],
  ['7.3e-6 K-1', 'per_temperature', 7.3e-6],
  ['7.3 ppm/K', 'per_temperature', 7.3e-6],
  ['6.2e-16 cm2/W', 'nonlinear_index', 6.2e-20],
  ['0.2 %/cm', 'inverse_length', 0.2],
  ['9398 cm-1', 'inverse_length', 939800],
  ['300 m/s', 'velocity', 300],
  ['5.95 mm/us', 'velocity', 5950],
  ['0.95', 'ratio', 0.95],
  ['1', 'ratio', 1],
  ['95 %', 'ratio', 0.95],
  ['95%', 'ratio', 0.95],
  ['99.5 %', 'ratio', 0.995],
  ['300 ppm', 'ratio', 3e-4],
  ['5 um/m', 'ratio', 5e-6],
];

describe('accepted spellings', () => {
  it.each(EXACT)('%s as %s', (text, dimension, si) => {
    expect(quantityOf(text, dimension).value).toBe(si);
  });

  it('keeps what was written', () => {
    expect(quantityOf(' 2.8e-19 cm² ', 'cross_section')).toEqual({ value: 2.8e-23, written: 2.8e-19, unit: 'cm²' });
    expect(quantityOf('0.95', 'ratio')).toEqual({ value: 0.95, written: 0.95, unit: '' });
    expect(quantityOf('25 Cel', 'temperature')).toEqual({ value: 298.15, written: 25, unit: 'Cel' });
  });

  it('reads -0 as plain zero', () => {
    expect(Object.is(quantityOf('-0 mm', 'length').value, 0)).toBe(true);
  });
});

describe('the table of dimensions', () => {
  const rows = Object.entries(DIMENSIONS) as [DimensionName, (typeof DIMENSIONS)[DimensionName]][];

  it.each(rows)('%s can read its own example, SI unit and usual units', (name, row) => {
    expect(readQuantity(row.example, name)).toHaveProperty('quantity');
    expect(quantityOf(`1 ${row.siUnit}`, name).value).toBe(1);
    for (const unit of row.units) expect(readQuantity(`1 ${unit}`, name), unit).toHaveProperty('quantity');
  });

  it('keeps case apart: milli is not mega', () => {
    expect(quantityOf('1 MW', 'power').value / quantityOf('1 mW', 'power').value).toBe(1e9);
  });
});

/** Powers of metre, kilogram, second, ampere, kelvin and radian, in that order. */
export type DimensionVector = readonly [number, number, number, number, number, number];

/** What a key of a design may hold. Some share a vector: a cross-section is an area, W/A is V. */
export type DimensionName =
  | 'ratio'
  | 'length'
  | 'area'
  | 'cross_section'
  | 'number_density'
  | 'time'
  | 'frequency'
  | 'power'
  | 'energy'
  | 'current'
  | 'voltage'
  | 'slope_efficiency'
  | 'fluence'
  | 'intensity'
  | 'temperature'
  | 'angle'
  | 'thermal_conductivity'
  | 'per_temperature'
  | 'nonlinear_index'
  | 'inverse_length'
  | 'velocity';

/** A dimension as a person meets it: its noun with article, a whole example, and the units usual in this field. */
export interface Dimension {
  readonly vector: DimensionVector;
  readonly noun: string;
  readonly example: string;
  readonly siUnit: string;
  readonly units: readonly string[];
}

function row(
  vector: DimensionVector,
  noun: string,
  example: string,
  siUnit: string,
  units: readonly string[],
): Dimension {
  return { vector, noun, example, siUnit, units };
}

/** Every dimension by name; `units` opens with the likeliest, in UCUM's spelling. */
export const DIMENSIONS: Readonly<Record<DimensionName, Dimension>> = {
  ratio: row([0, 0, 0, 0, 0, 0], 'a ratio', '95 %', '', ['%', 'ppm']),
  length: row([1, 0, 0, 0, 0, 0], 'a length', '1.3 mm', 'm', ['mm', 'm', 'um', 'nm', 'cm']),
  area: row([2, 0, 0, 0, 0, 0], 'an area', '2.5 mm2', 'm2', ['mm2', 'cm2', 'um2', 'm2']),
  cross_section: row([2, 0, 0, 0, 0, 0], 'a cross-section', '2.8e-19 cm2', 'm2', ['cm2', 'm2']),
  number_density: row([-3, 0, 0, 0, 0, 0], 'a number density', '1.38e20 cm-3', 'm-3', ['cm-3', 'm-3']),
  time: row([0, 0, 1, 0, 0, 0], 'a time', '200 us', 's', ['us', 'ns', 'ms', 'ps', 's', 'fs']),
  frequency: row([0, 0, -1, 0, 0, 0], 'a frequency', '20 Hz', 'Hz', ['Hz', 'kHz', 'MHz', 'GHz', 'THz']),
  power: row([2, 1, -3, 0, 0, 0], 'a power', '600 W', 'W', ['W', 'mW', 'kW', 'MW', 'GW']),
  energy: row([2, 1, -2, 0, 0, 0], 'an energy', '13 mJ', 'J', ['mJ', 'J', 'uJ', 'nJ', 'kJ']),
  current: row([0, 0, 0, 1, 0, 0], 'a current', '90 A', 'A', ['A', 'mA', 'kA']),
  voltage: row([2, 1, -3, -1, 0, 0], 'a voltage', '3.2 kV', 'V', ['V', 'kV', 'mV']),
  slope_efficiency: row([2, 1, -3, -1, 0, 0], 'a slope efficiency', '1.1 W/A', 'W/A', ['W/A', 'mW/A', 'mW/mA']),
  fluence: row([0, 1, -2, 0, 0, 0], 'a fluence', '10 J/cm2', 'J/m2', ['J/cm2', 'mJ/cm2', 'J/m2']),
  intensity: row([0, 1, -3, 0, 0, 0], 'an intensity', '500 MW/cm2', 'W/m2', [
    'MW/cm2',
    'GW/cm2',
    'kW/cm2',
    'W/cm2',
    'mW/cm2',
    'W/m2',
  ]),
  temperature: row([0, 0, 0, 0, 1, 0], 'a temperature', '25 Cel', 'K', ['Cel', 'K']),
  angle: row([0, 0, 0, 0, 0, 1], 'an angle', '1.5 mrad', 'rad', ['mrad', 'deg', 'urad', 'rad']),
  thermal_conductivity: row([1, 1, -3, 0, -1, 0], 'a thermal conductivity', '10.7 W/(m.K)', 'W/(m.K)', [
    'W/(m.K)',
    'W/(cm.K)',
    'mW/(m.K)',
  ]),
  per_temperature: row([0, 0, 0, 0, -1, 0], 'a change per kelvin', '7.3e-6 K-1', 'K-1', ['K-1', 'ppm/K', '%/K']),
  nonlinear_index: row([0, -1, 3, 0, 0, 0], 'a nonlinear index', '6.2e-20 m2/W', 'm2/W', ['m2/W', 'cm2/W']),
  inverse_length: row([-1, 0, 0, 0, 0, 0], 'an inverse length', '0.3 cm-1', 'm-1', ['cm-1', 'm-1', 'mm-1', '%/cm']),
  velocity: row([1, 0, -1, 0, 0, 0], 'a velocity', '300 m/s', 'm/s', ['m/s', 'mm/s', 'mm/us', 'km/s']),
};

/** Whether two units measure the same kind of thing. */
export function sameDimension(one: DimensionVector, other: DimensionVector): boolean {
  return (
    one[0] === other[0] &&
    one[1] === other[1] &&
    one[2] === other[2] &&
    one[3] === other[3] &&
    one[4] === other[4] &&
    one[5] === other[5]
  );
}

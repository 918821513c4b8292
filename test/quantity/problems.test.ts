import { describe, expect, it } from 'vitest';
import type { DimensionName } from '../../extension/core/quantity/dimension.ts';
import { type QuantityProblem, readQuantity } from '../../extension/core/quantity/quantity.ts';
import { mended, problemOf } from './helpers.ts';

type Case = readonly [
  text: string,
  dimension: DimensionName,
  code: QuantityProblem['code'],
  message: string,
  underlined: string,
  mendedTexts: readonly string[],
];

const LENGTH = 'expected a length such as `1.3 mm`';

const CASES: readonly Case[] = [
  ['1.3', 'length', 'missing-unit', `1.3 has no unit; ${LENGTH}`, '1.3', ['1.3 mm', '1.3 m', '1.3 um', '1.3 nm']],
  [
    '600 ',
    'power',
    'missing-unit',
    '600 has no unit; expected a power such as `600 W`',
    '600',
    ['600 W ', '600 mW ', '600 kW ', '600 MW '],
  ],
  ['1.3 ± 0.1 mm', 'length', 'missing-unit', `1.3 has no unit; ${LENGTH}`, '1.3', ['1.3 mm ± 0.1 mm']],
  ['12 mj', 'energy', 'unknown-unit', 'unknown unit `mj`; did you mean `mJ`?', 'mj', ['12 mJ']],
  ['12 mw', 'power', 'unknown-unit', 'unknown unit `mw`; did you mean `mW` or `MW`?', 'mw', ['12 mW', '12 MW']],
  ['20 hz', 'frequency', 'unknown-unit', 'unknown unit `hz`; did you mean `Hz`?', 'hz', ['20 Hz']],
  ['10 J/CM^2', 'fluence', 'unknown-unit', 'unknown unit `J/CM^2`; did you mean `J/cm2`?', 'J/CM^2', ['10 J/cm2']],
  [
    '5 pj/m2',
    'fluence',
    'unknown-unit',
    'unknown unit `pj/m2`; did you mean `PJ/m2` or `pJ/m2`?',
    'pj/m2',
    ['5 PJ/m2', '5 pJ/m2'],
  ],
  [
    '5 Microseconds',
    'time',
    'unknown-unit',
    'unknown unit `Microseconds`; did you mean `us`?',
    'Microseconds',
    ['5 us'],
  ],
  ['5 microns', 'length', 'unknown-unit', 'unknown unit `microns`; did you mean `um`?', 'microns', ['5 um']],
  ['5 mmm', 'length', 'unknown-unit', 'unknown unit `mmm`; did you mean `mm`?', 'mmm', ['5 mm']],
  ['3 dB', 'ratio', 'unknown-unit', 'unknown unit `dB`; expected a ratio such as `95 %`', 'dB', []],
  ['1 at%', 'ratio', 'unknown-unit', 'unknown unit `at%`; expected a ratio such as `95 %`', 'at%', []],
  ['5 J/', 'energy', 'unknown-unit', 'unknown unit `J/`; expected an energy such as `13 mJ`', 'J/', []],
  ['5 (m', 'length', 'unknown-unit', `unknown unit \`(m\`; ${LENGTH}`, '(m', []],
  ['5 m)', 'length', 'unknown-unit', `unknown unit \`m)\`; ${LENGTH}`, 'm)', []],
  ['5 m^0.5', 'length', 'unknown-unit', `unknown unit \`m^0.5\`; ${LENGTH}`, 'm^0.5', []],
  ['5 m12', 'length', 'unknown-unit', `unknown unit \`m12\`; ${LENGTH}`, 'm12', []],
  ['5 % mm', 'length', 'unknown-unit', `unknown unit \`% mm\`; ${LENGTH}`, '% mm', []],
  [
    '7e-6 /°C',
    'per_temperature',
    'unknown-unit',
    "`°C` is a point on a scale and can't be part of `/°C`; write `K`",
    '/°C',
    ['7e-6 /K'],
  ],
  ['600 mm', 'power', 'wrong-dimension', '`600 mm` is a length; expected a power such as `600 W`', '600 mm', []],
  ['5 V', 'power', 'wrong-dimension', '`5 V` is a voltage; expected a power such as `600 W`', '5 V', []],
  ['5 W/A', 'power', 'wrong-dimension', '`5 W/A` is a slope efficiency; expected a power such as `600 W`', '5 W/A', []],
  ['5 kg', 'length', 'wrong-dimension', `\`5 kg\` is not a length; ${LENGTH}`, '5 kg', []],
  ['5 %', 'length', 'wrong-dimension', `\`5 %\` is a ratio; ${LENGTH}`, '5 %', []],
  [
    '1.38e20 cm3',
    'number_density',
    'wrong-dimension',
    '`1.38e20 cm3` is not a number density; expected a number density such as `1.38e20 cm-3`',
    '1.38e20 cm3',
    [],
  ],
  [
    '10 W/m K',
    'thermal_conductivity',
    'ambiguous-unit',
    '`W/m K` can be read in two ways; write `W/(m K)`',
    'W/m K',
    ['10 W/(m K)'],
  ],
  [
    '10 W/m/K',
    'thermal_conductivity',
    'ambiguous-unit',
    '`W/m/K` can be read in two ways; write `W/(m.K)`',
    'W/m/K',
    ['10 W/(m.K)'],
  ],
  [
    '5 J/cm2 s',
    'fluence',
    'ambiguous-unit',
    '`J/cm2 s` can be read in two ways; put what is divided by in parentheses',
    'J/cm2 s',
    [],
  ],
  [
    '1,2 mm',
    'length',
    'not-a-quantity',
    `\`1,2 mm\` has a comma in its number, and the decimal sign is a point; ${LENGTH}`,
    '1,2 mm',
    ['1.2 mm'],
  ],
  [
    '1,200 mm',
    'length',
    'not-a-quantity',
    `\`1,200 mm\` has a comma in its number, and the decimal sign is a point; ${LENGTH}`,
    '1,200 mm',
    ['1.200 mm', '1200 mm'],
  ],
  [
    '1,234,567 mm',
    'length',
    'not-a-quantity',
    `\`1,234,567 mm\` has a comma in its number, and the decimal sign is a point; ${LENGTH}`,
    '1,234,567 mm',
    ['1234567 mm'],
  ],
  [
    '1.5 mm ± 0,1 mm',
    'length',
    'not-a-quantity',
    `\`1.5 mm ± 0,1 mm\` has a comma in its number, and the decimal sign is a point; ${LENGTH}`,
    '1.5 mm ± 0,1 mm',
    ['1.5 mm ± 0.1 mm'],
  ],
  [
    '1_000 mm',
    'length',
    'not-a-quantity',
    `\`1_000 mm\` has marks between its digits; ${LENGTH}`,
    '1_000 mm',
    ['1000 mm'],
  ],
  [
    '1 000 mm',
    'length',
    'not-a-quantity',
    `\`1 000 mm\` has spaces between its digits; ${LENGTH}`,
    '1 000 mm',
    ['1000 mm'],
  ],
  [
    '2.8×10⁻¹⁹ cm2',
    'cross_section',
    'not-a-quantity',
    '`2.8×10⁻¹⁹ cm2` spells out its power of ten; expected a cross-section such as `2.8e-19 cm2`',
    '2.8×10⁻¹⁹ cm2',
    ['2.8e-19 cm2'],
  ],
  [
    '2.8 x 10^-19 cm2',
    'cross_section',
    'not-a-quantity',
    '`2.8 x 10^-19 cm2` spells out its power of ten; expected a cross-section such as `2.8e-19 cm2`',
    '2.8 x 10^-19 cm2',
    ['2.8e-19 cm2'],
  ],
  [
    '\u22125 mm',
    'length',
    'not-a-quantity',
    `\`\u22125 mm\` starts with a typographic minus; ${LENGTH}`,
    '\u22125 mm',
    ['-5 mm'],
  ],
  ['0x10 mm', 'length', 'not-a-quantity', `\`0x10 mm\` is not a decimal number; ${LENGTH}`, '0x10 mm', []],
  ['5-6 mm', 'length', 'not-a-quantity', `\`5-6 mm\` is not one number with a unit; ${LENGTH}`, '5-6 mm', []],
  ['1.2.3 mm', 'length', 'not-a-quantity', `\`1.2.3 mm\` is not one number with a unit; ${LENGTH}`, '1.2.3 mm', []],
  ['mm', 'length', 'not-a-quantity', `\`mm\` doesn't start with a number; ${LENGTH}`, 'mm', []],
  ['', 'length', 'not-a-quantity', `nothing is written here; ${LENGTH}`, '', []],
  ['   ', 'length', 'not-a-quantity', `nothing is written here; ${LENGTH}`, '', []],
  ['nan', 'length', 'not-finite', `\`nan\` is not a finite number; ${LENGTH}`, 'nan', []],
  ['.inf', 'length', 'not-finite', `\`.inf\` is not a finite number; ${LENGTH}`, '.inf', []],
  ['-Infinity mm', 'length', 'not-finite', `\`-Infinity mm\` is not a finite number; ${LENGTH}`, '-Infinity mm', []],
  [
    '1e999 W',
    'power',
    'not-finite',
    '1e999 W is beyond what a number can hold; expected a power such as `600 W`',
    '1e999 W',
    [],
  ],
  ['1e308 km', 'length', 'not-finite', `1e308 km is beyond what a number can hold; ${LENGTH}`, '1e308 km', []],
  [
    '1e-400 m',
    'length',
    'not-finite',
    `1e-400 m is too small to be told from zero; ${LENGTH}, or write 0`,
    '1e-400 m',
    [],
  ],
  [
    '1e-320 nm',
    'length',
    'not-finite',
    `1e-320 nm is too small to be told from zero; ${LENGTH}, or write 0`,
    '1e-320 nm',
    [],
  ],
];

describe('problems', () => {
  it.each(CASES)('%s as %s', (text, dimension, code, message, underlined, mendedTexts) => {
    const problem = problemOf(text, dimension);
    expect(problem.code).toBe(code);
    expect(problem.message).toBe(message);
    expect(text.slice(problem.range.start, problem.range.end)).toBe(underlined);
    expect(mended(text, problem)).toEqual(mendedTexts);
    for (const fixed of mendedTexts) expect(readQuantity(fixed, dimension), fixed).toHaveProperty('quantity');
  });

  it('places range and fixes behind leading spaces', () => {
    const problem = problemOf('   12 mj', 'energy');
    expect(problem.range).toEqual({ start: 6, end: 8 });
    expect(mended('   12 mj', problem)).toEqual(['   12 mJ']);
  });

  it('mends two faults one after the other', () => {
    const [first = ''] = mended('12 mj ± 1 mj', problemOf('12 mj ± 1 mj', 'energy'));
    expect(first).toBe('12 mJ ± 1 mj');
    expect(mended(first, problemOf(first, 'energy'))).toEqual(['12 mJ ± 1 mJ']);
  });

  it('an exponent of any length is beyond or below, never a wrong value', () => {
    expect(problemOf(`1e${'9'.repeat(150)} m`, 'length').code).toBe('not-finite');
    expect(problemOf(`1e-${'9'.repeat(150)} m`, 'length').code).toBe('not-finite');
    expect(readQuantity(`0e${'9'.repeat(150)} m`, 'length')).toHaveProperty('quantity.value', 0);
  });
});

import { describe, expect, it } from 'vitest';
import type { DimensionName } from '../../extension/core/quantity/dimension.ts';
import { problemOf, quantityOf } from './helpers.ts';

const HALF_WIDTHS: readonly (readonly [string, DimensionName, number])[] = [
  ['1.30 mm ± 2 %', 'length', 0.02 * 1.3e-3],
  ['1.30 mm ± 2%', 'length', 0.02 * 1.3e-3],
  ['1.30 mm ± 500 ppm', 'length', 5e-4 * 1.3e-3],
  ['-1.30 mm ± 2 %', 'length', 0.02 * 1.3e-3],
  ['1.3 mm ± 0.1 mm', 'length', 1e-4],
  ['1.3 mm ± 100 um', 'length', 1e-4],
  ['1.3 mm ± 0.1', 'length', 1e-4],
  ['1.3 mm ± 0', 'length', 0],
  ['1.3mm±0.1mm', 'length', 1e-4],
  ['1.3 mm +/- 0.1 mm', 'length', 1e-4],
  ['1.3 mm +- 0.1 mm', 'length', 1e-4],
  ['1e+3 mm +- 1e+2 mm', 'length', 0.1],
  ['600 W ± 15 W', 'power', 15],
  ['25 Cel ± 2 K', 'temperature', 2],
  ['25 Cel ± 2 Cel', 'temperature', 2],
  ['25 Cel ± 2', 'temperature', 2],
  ['300 K ± 1 %', 'temperature', 3],
  ['0 mm ± 2 %', 'length', 0],
];

describe('tolerances', () => {
  it.each(HALF_WIDTHS)('%s', (text, dimension, halfWidth) => {
    expect(quantityOf(text, dimension).tolerance).toBe(halfWidth);
  });

  it('reads percent after percent as points, and percent after a bare ratio as relative', () => {
    expect(quantityOf('85 % ± 2 %', 'ratio').tolerance).toBe(0.02);
    expect(quantityOf('85 % ± 2', 'ratio').tolerance).toBe(0.02);
    expect(quantityOf('85 % ± 500 ppm', 'ratio').tolerance).toBe(5e-4);
    expect(quantityOf('0.95 ± 2 %', 'ratio').tolerance).toBe(0.95 * 0.02);
    expect(quantityOf('0.95 ± 0.01', 'ratio').tolerance).toBe(0.01);
  });

  it('is absent where none is written', () => {
    expect(quantityOf('1.3 mm', 'length')).not.toHaveProperty('tolerance');
  });

  it.each([
    ['1.3 mm ± -0.1 mm', 'length', "a tolerance can't be negative, and `-0.1 mm` is", 9, 16],
    ['1.3 mm ± -2 %', 'length', "a tolerance can't be negative, and `-2 %` is", 9, 13],
    ['1.3 mm ± 5 J', 'length', 'the tolerance `5 J` is an energy; expected one such as `± 2 %` or `± 0.1 mm`', 9, 12],
    ['0.95 ± 5 J', 'ratio', 'the tolerance `5 J` is an energy; expected one such as `± 2 %`', 7, 10],
    ['1.3 mm ±', 'length', 'nothing follows `±`; expected one such as `± 2 %` or `± 0.1 mm`', 7, 8],
    ['1.3 mm ± much', 'length', '`much` is not a tolerance; expected one such as `± 2 %` or `± 0.1 mm`', 9, 13],
    ['1 mm ± 1 ± 2', 'length', '`1 ± 2` is not a tolerance; expected one such as `± 2 %` or `± 0.1 mm`', 7, 12],
    [
      '25 Cel ± 2 %',
      'temperature',
      'a percentage of degrees Celsius has no meaning; write the tolerance in kelvin',
      9,
      12,
    ],
    [
      '5 mm +0.1/-0.2',
      'length',
      '`mm +0.1/-0.2` is not a unit; a tolerance is written like `± 0.1` and is the same both ways',
      2,
      14,
    ],
  ] as const)('refuses %s', (text, dimension, message, start, end) => {
    expect(problemOf(text, dimension)).toMatchObject({ code: 'bad-tolerance', message, range: { start, end } });
  });

  it('names an unknown unit in the tolerance where it stands', () => {
    const problem = problemOf('12 mJ ± 1 mj', 'energy');
    expect(problem).toMatchObject({ code: 'unknown-unit', range: { start: 10, end: 12 } });
    expect(problem.message).toBe('unknown unit `mj`; did you mean `mJ`?');
  });

  it('refuses a tolerance beyond or below what a number can hold', () => {
    expect(problemOf('1 mm ± 1e999 mm', 'length').code).toBe('not-finite');
    expect(problemOf('1 mm ± 1e-400 mm', 'length').code).toBe('not-finite');
  });
});

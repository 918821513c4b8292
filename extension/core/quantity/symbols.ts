import type { DimensionVector } from './dimension.ts';

/**
 * A unit as SI sees it: one of it is `times / over · 10^exponent`, above the zero of Celsius if `kind` says so.
 * Powers of ten stay apart from the rest so that `100 us` becomes exactly 1e-4.
 */
export interface Unit {
  readonly exponent: number;
  readonly times: number;
  readonly over: number;
  readonly vector: DimensionVector;
  readonly kind: 'plain' | 'ratio' | 'celsius';
}

/** Hundredths of a kelvin, so that it is a whole number; BIPM, The International System of Units, 9th ed. (2019), 2.3.1. */
export const CELSIUS_ZERO = 27_315;

// BIPM, SI brochure, 9th ed., table 7; `u` is UCUM's micro, then the micro sign and the Greek letter.
const PREFIXES: readonly (readonly [string, number])[] = [
  ['', 0],
  ['Q', 30],
  ['R', 27],
  ['Y', 24],
  ['Z', 21],
  ['E', 18],
  ['P', 15],
  ['T', 12],
  ['G', 9],
  ['M', 6],
  ['k', 3],
  ['h', 2],
  ['da', 1],
  ['d', -1],
  ['c', -2],
  ['m', -3],
  ['u', -6],
  ['\u00b5', -6],
  ['\u03bc', -6],
  ['n', -9],
  ['p', -12],
  ['f', -15],
  ['a', -18],
  ['z', -21],
  ['y', -24],
  ['r', -27],
  ['q', -30],
];

type Row = readonly [symbols: string, vector: DimensionVector, exponent: number, times?: number, over?: number];

// Spellings apart by a space. SI brochure, 9th ed., tables 2 and 4; UCUM specification 2.1, tables 2 to 5.
const PREFIXED: readonly Row[] = [
  ['m', [1, 0, 0, 0, 0, 0], 0],
  ['g', [0, 1, 0, 0, 0, 0], -3],
  ['s', [0, 0, 1, 0, 0, 0], 0],
  ['A', [0, 0, 0, 1, 0, 0], 0],
  ['K', [0, 0, 0, 0, 1, 0], 0],
  ['rad', [0, 0, 0, 0, 0, 1], 0],
  ['Hz', [0, 0, -1, 0, 0, 0], 0],
  ['N', [1, 1, -2, 0, 0, 0], 0],
  ['Pa', [-1, 1, -2, 0, 0, 0], 0],
  ['J', [2, 1, -2, 0, 0, 0], 0],
  ['W', [2, 1, -3, 0, 0, 0], 0],
  ['C', [0, 0, 1, 1, 0, 0], 0],
  ['V', [2, 1, -3, -1, 0, 0], 0],
  ['Ohm \u03a9 \u2126', [2, 1, -3, -2, 0, 0], 0],
  ['F', [-2, -1, 4, 2, 0, 0], 0],
  ['L l', [3, 0, 0, 0, 0, 0], -3],
  ['eV', [2, 1, -2, 0, 0, 0], -19, 1.602176634],
];

const PLAIN: readonly Row[] = [
  ['min', [0, 0, 1, 0, 0, 0], 1, 6],
  ['h', [0, 0, 1, 0, 0, 0], 2, 36],
  ['d', [0, 0, 1, 0, 0, 0], 2, 864],
  ['in [in_i]', [1, 0, 0, 0, 0, 0], -4, 254],
  ['Ao \u00c5 \u212b', [1, 0, 0, 0, 0, 0], -10],
  ['deg \u00b0', [0, 0, 0, 0, 0, 1], 0, Math.PI, 180],
  ['arcmin', [0, 0, 0, 0, 0, 1], 0, Math.PI, 10_800],
  ['arcsec', [0, 0, 0, 0, 0, 1], 0, Math.PI, 648_000],
];

const RATIOS: readonly Row[] = [
  ['%', [0, 0, 0, 0, 0, 0], -2],
  ['ppm [ppm]', [0, 0, 0, 0, 0, 0], -6],
];

const POINTS: readonly Row[] = [['Cel \u00b0C \u2103 degC', [0, 0, 0, 0, 1, 0], 0]];

function* spelled(rows: readonly Row[], prefixes: typeof PREFIXES, kind: Unit['kind']): Generator<[string, Unit]> {
  for (const [symbols, vector, exponent, times = 1, over = 1] of rows) {
    for (const symbol of symbols.split(' ')) {
      for (const [prefix, power] of prefixes) {
        yield [prefix + symbol, { exponent: exponent + power, times, over, vector, kind }];
      }
    }
  }
}

const NO_PREFIX = PREFIXES.slice(0, 1);

/** Every symbol that stands for one unit, prefix included; a symbol of its own (`min`) wins over prefix and symbol. */
export const SYMBOLS: ReadonlyMap<string, Unit> = new Map([
  ...spelled(PREFIXED, PREFIXES, 'plain'),
  ...spelled(PLAIN, NO_PREFIX, 'plain'),
  ...spelled(RATIOS, NO_PREFIX, 'ratio'),
  ...spelled(POINTS, NO_PREFIX, 'celsius'),
]);

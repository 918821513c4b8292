import fc from 'fast-check';
import { unit as oracle } from 'mathjs';
import { describe, expect, it } from 'vitest';
import { parseUnit } from '../../extension/core/quantity/unit.ts';

/** Our symbol and mathjs's; it knows no second micro sign, `°`, `Cel` or `%`. */
const PREFIXES = ['', 'G', 'M', 'k', 'm', 'n', 'p', 'f', 'T', 'c', 'P', 'E', 'a', 'u', '\u00b5', '\u03bc'] as const;
const PREFIXABLE = ['m', 'g', 's', 'A', 'K', 'Hz', 'N', 'Pa', 'J', 'W', 'C', 'V', 'F', 'L'] as const;
const PLAIN = [
  ['min', 'minute'],
  ['h', 'hour'],
  ['d', 'day'],
  ['in', 'inch'],
  ['deg', 'deg'],
  ['arcsec', 'arcsec'],
  ['rad', 'rad'],
] as const;

const SI = ['m', 'kg', 's', 'A', 'K', 'rad'] as const;

interface Factor {
  readonly ours: string;
  readonly theirs: string;
  readonly power: number;
}

const symbol = fc.oneof(
  {
    weight: 4,
    arbitrary: fc
      .tuple(fc.constantFrom(...PREFIXES), fc.constantFrom(...PREFIXABLE))
      .map(([p, s]) => [p + s, p.replace(/[\u00b5\u03bc]/, 'u') + s] as const),
  },
  { weight: 1, arbitrary: fc.constantFrom(...PLAIN) },
);
const factor = fc
  .tuple(symbol, fc.integer({ min: 1, max: 3 }))
  .map(([[ours, theirs], power]): Factor => ({ ours, theirs, power }));
const joint = fc.constantFrom('.', '*', ' ', '·', ' · ', ' * ');
const style = fc.constantFrom('', '^', '**', 'superscript');

function power(value: number, spelling: string): string {
  if (value === 1) return '';
  if (spelling !== 'superscript') return `${spelling}${value}`;
  return String(value).replace('-', '⁻').replace('1', '¹').replace('2', '²').replace('3', '³');
}

function ours(factors: readonly Factor[], sign: number, between: string, spelling: string): string {
  return factors.map((one) => one.ours + power(sign * one.power, spelling)).join(between);
}

function theirs(factors: readonly Factor[]): string {
  return factors.map((one) => `${one.theirs}^${one.power}`).join(' * ');
}

describe('unit expressions agree with mathjs', () => {
  it('on random products and quotients', () => {
    const top = fc.array(factor, { minLength: 1, maxLength: 3 });
    const bottom = fc.array(factor, { maxLength: 3 });
    fc.assert(
      fc.property(top, bottom, joint, style, fc.boolean(), (above, below, between, spelling, negative) => {
        const denominator = ours(below, 1, between, spelling);
        const text =
          below.length === 0
            ? ours(above, 1, between, spelling)
            : negative
              ? ours(above, 1, between, spelling) + between + ours(below, -1, between, spelling)
              : `${ours(above, 1, between, spelling)}/${below.length > 1 ? `(${denominator})` : denominator}`;
        const parsed = parseUnit(text);
        if ('fault' in parsed) throw new Error(`${text}: ${parsed.fault}`);
        const base = SI.map((name, place) => [name, parsed.vector[place] ?? 0] as const)
          .filter(([, exponent]) => exponent !== 0)
          .map(([name, exponent]) => ` * ${name}^${exponent}`);
        // Throws where the dimensions differ. A candela on both sides, because mathjs reads no empty unit.
        const quotient = `1 cd * ${theirs(above)}${below.length > 0 ? ` / (${theirs(below)})` : ''}`;
        const expected = oracle(quotient).toNumber(`cd${base.join('')}`);
        const actual = Number(`1e${parsed.exponent}`) * (parsed.times / parsed.over);
        expect(Math.abs(actual / expected - 1), `${text}: ${actual}, ${expected}`).toBeLessThan(1e-12);
      }),
      { numRuns: 2000 },
    );
  });
});

import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { DIMENSIONS, type DimensionName } from '../../extension/core/quantity/dimension.ts';
import { readQuantity } from '../../extension/core/quantity/quantity.ts';

const names = Object.keys(DIMENSIONS) as DimensionName[];
const dimension = fc.constantFrom(...names);
const pieces = fc.constantFrom(
  ...['1', '0', '.', 'e', '-', '+', '±', '+/-', ' ', ',', '_', '%', 'ppm', 'm', 'mm', 'J', 'W', '/', '(', ')', '^'],
  ...[
    '**',
    '*',
    '·',
    '²',
    '⁻',
    'Cel',
    '°C',
    '1e999',
    '1e-400',
    'NaN',
    'inf',
    '×10',
    '\u0000',
    '`',
    '\ud83d\ude00',
    '\ud800',
  ],
);
const nearlyQuantities = fc.array(pieces, { maxLength: 24 }).map((parts) => parts.join(''));

function longestShared(message: string, text: string): number {
  let longest = 0;
  for (let start = 0; start < message.length; start++) {
    while (start + longest < message.length && text.includes(message.slice(start, start + longest + 1))) longest++;
  }
  return longest;
}

describe('any text', () => {
  it('gives a finite quantity, or a problem with ranges inside the text and fixes that help', () => {
    fc.assert(
      fc.property(fc.oneof(nearlyQuantities, fc.string({ unit: 'binary', maxLength: 60 })), dimension, (text, name) => {
        const result = readQuantity(text, name);
        if ('quantity' in result) {
          const { value, written, tolerance = 0 } = result.quantity;
          return Number.isFinite(value) && Number.isFinite(written) && Number.isFinite(tolerance) && tolerance >= 0;
        }
        const { range, fixes, message } = result.problem;
        expect(message.replace(/`[^`]*`/g, '')).not.toMatch(/undefined|NaN|\[object/);
        for (const place of [range, ...fixes.map((fix) => fix.range)]) {
          expect(place.start).toBeGreaterThanOrEqual(0);
          expect(place.end).toBeGreaterThanOrEqual(place.start);
          expect(place.end).toBeLessThanOrEqual(text.length);
        }
        for (const fix of fixes) {
          const fixed = text.slice(0, fix.range.start) + fix.text + text.slice(fix.range.end);
          const again = readQuantity(fixed, name);
          if ('problem' in again) expect(again.problem.range.start).toBeGreaterThanOrEqual(fix.range.start);
        }
        return true;
      }),
      { numRuns: 5000 },
    );
  });

  it.each([
    ['letters', 'x'],
    ['digits', '7'],
    ['spaces', ' '],
    ['signs', '±'],
    ['parentheses', '5 ('],
    ['commas', '1,'],
    ['products', '5 m.'],
    ['surrogates', '\ud83d\ude00'],
  ])('a megabyte of %s is one short problem', (_, piece) => {
    const text = piece.repeat(Math.ceil(1e6 / piece.length));
    const result = readQuantity(text, 'length');
    if ('quantity' in result) throw new Error('read');
    expect(result.problem.code).toBe('not-a-quantity');
    expect(longestShared(result.problem.message, text)).toBeLessThanOrEqual(40);
    expect(result.problem.message.length).toBeLessThan(120);
  });

  it('a message quotes at most some forty characters in a row', () => {
    const tails = [
      'm'.repeat(120),
      `${'(m.'.repeat(40)}`,
      `m/${'m/'.repeat(50)}m`,
      `W/m ${'K '.repeat(60)}`,
      `J ± ${'q'.repeat(90)}`,
    ];
    for (const tail of tails) {
      const text = `5 ${tail}`;
      const result = readQuantity(text, 'length');
      expect(result).toHaveProperty('problem');
      if ('problem' in result) expect(longestShared(result.problem.message, text), text).toBeLessThanOrEqual(40);
    }
  });
});

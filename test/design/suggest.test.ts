import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { editDistance, nearest } from '../../extension/core/design/suggest.ts';

const keys = ['wavelength', 'power', 'diode', 'duration', 'absorbed_fraction', 'quantum_efficiency', 'beam', 'kind'];

describe('the nearest known word', () => {
  test.each([
    ['duraton', 'duration'],
    ['wavelenght', 'wavelength'],
    ['Power', 'power'],
    ['absorbed-fraction', 'absorbed_fraction'],
    ['quantum efficiency', 'quantum_efficiency'],
    ['baem', 'beam'],
  ])('%s means %s', (word, meant) => {
    expect(nearest(word, keys)).toBe(meant);
  });

  test.each(['colour', 'x', '', 'completely_different', 'p'.repeat(100_000)])('%.20s means none of them', (word) => {
    expect(nearest(word, keys)).toBeUndefined();
  });
});

describe('edit distance', () => {
  test('known cases', () => {
    expect(editDistance('kitten', 'sitting')).toBe(3);
    expect(editDistance('ab', 'ba')).toBe(1);
    expect(editDistance('', 'abc')).toBe(3);
  });

  test('is zero for equal words, the same both ways, and no more than the longer word', () => {
    const word = fc.string({ maxLength: 12 });
    fc.assert(
      fc.property(word, word, (one, other) => {
        const distance = editDistance(one, other);
        expect(distance).toBe(editDistance(other, one));
        expect(distance === 0).toBe(one === other);
        expect(distance).toBeLessThanOrEqual(Math.max(one.length, other.length));
        expect(distance).toBeGreaterThanOrEqual(Math.abs(one.length - other.length));
      }),
    );
  });
});
